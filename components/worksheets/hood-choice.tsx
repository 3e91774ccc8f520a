import { HOODS, type HoodName } from '@/lib/air/hood-airflow';
import { fieldId } from '@/components/forms/field-id';
import { HOOD_WORDS } from '@/lib/worksheets/hood-airflow/names';
import { HoodPicture } from './hood-picture';

function Hood({ hood, chosen, first }: { hood: HoodName; chosen: boolean; first: boolean }) {
  return (
    <label className="flex cursor-pointer items-center gap-3 border border-rule bg-surface p-2 has-checked:border-brass has-checked:outline-2 has-checked:outline-brass has-focus-visible:outline-3 has-focus-visible:outline-brass">
      <input
        type="radio"
        name="hood"
        value={hood}
        id={first ? fieldId('hood') : undefined}
        defaultChecked={chosen}
        className="size-4 shrink-0 accent-(--link)"
      />
      <HoodPicture hood={hood} />
      <span className="leading-tight">
        <strong className="block">{HOOD_WORDS[hood].name}</strong>
        <span className="text-base text-quiet">{HOOD_WORDS[hood].tell}</span>
      </span>
    </label>
  );
}

/** Which hood it is, by its picture. Several alike end a duct; what is around the end tells them apart. */
export function HoodChoice({ chosen, error }: { chosen: string; error?: string }) {
  return (
    <fieldset aria-describedby={error && 'hood-error'} className="space-y-2">
      <legend className="mb-2 font-semibold">What does the hood look like?</legend>
      {error && (
        <p id="hood-error" className="text-base font-semibold text-kiln">
          {error}
        </p>
      )}
      <div className="grid gap-2 sm:grid-cols-2 lg:grid-cols-1">
        {HOODS.map((hood, i) => (
          <Hood key={hood} hood={hood} chosen={hood === chosen} first={i === 0} />
        ))}
      </div>
    </fieldset>
  );
}
