import { WORK, type Work } from '@/lib/worksheets/hood-airflow/fields';
import { WORK_WORDS } from '@/lib/worksheets/hood-airflow/names';

/** What is true of the work and must be said before any number. */
export function WorkChoice({ chosen }: { chosen: readonly Work[] }) {
  return (
    <fieldset>
      <legend className="mb-1 font-semibold">Is any of this true of the work?</legend>
      {WORK.map((work) => (
        <label key={work} className="flex cursor-pointer items-start gap-2 py-1">
          <input
            type="checkbox"
            name="work"
            value={work}
            defaultChecked={chosen.includes(work)}
            className="mt-1.5 size-4 shrink-0 accent-(--link)"
          />
          {WORK_WORDS[work]}
        </label>
      ))}
    </fieldset>
  );
}
