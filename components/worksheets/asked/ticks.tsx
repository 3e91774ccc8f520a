import { fieldId } from '@/components/forms/field-id';
import type { ChecksAsk, ChoiceAsk, Option } from '@/lib/worksheets/ask/fields';
import type { FormState } from './form-state';

/** What a choice says before anything is chosen. */
export const CHOOSE = 'Choose';

/** A choice that may be left out can be taken back; one that only says “Choose” needs no button for that. */
const nothing = (field: ChecksAsk | ChoiceAsk): Option[] =>
  field.as === 'choice' && field.first && field.first !== CHOOSE ? [{ value: '', label: field.first }] : [];

type Props = { field: ChecksAsk | ChoiceAsk; label: string; path: string; state: FormState; error?: string };

/** Words to tick, any of them or one of them, under what they are about. */
export function Ticks({ field, label, path, state, error }: Props) {
  const ticked = state.typed.texts.get(path) ?? [];
  const type = field.as === 'checks' ? 'checkbox' : 'radio';
  const id = fieldId(path);
  return (
    <fieldset id={id} tabIndex={-1} aria-describedby={error && `${id}-error`}>
      <legend className={field.as === 'checks' ? 'sr-only' : 'font-semibold'}>{label}</legend>
      {field.help && <p className="text-base text-quiet">{field.help}</p>}
      {[...nothing(field), ...field.options].map(({ value, label: words }) => (
        <label key={value} className="flex cursor-pointer items-start gap-2 py-1">
          <input
            {...{ type, name: path, value }}
            defaultChecked={ticked.includes(value) || (value === '' && ticked.length === 0)}
            className="mt-1.5 size-4 shrink-0 accent-(--link)"
          />
          {words}
        </label>
      ))}
      {error && (
        <p id={`${id}-error`} className="text-base font-semibold text-kiln">
          {error}
        </p>
      )}
    </fieldset>
  );
}
