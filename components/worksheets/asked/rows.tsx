import { Button } from '@/components/ui/button';
import { fieldId } from '@/components/forms/field-id';
import type { RowsAsk } from '@/lib/worksheets/ask/fields';
import { rowsIn } from '@/lib/worksheets/ask/typed';
import { AskedFields } from './field-of';
import type { FormState } from './form-state';

type Props = { rows: RowsAsk; prefix: string; state: FormState };

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

/** Alike things, a box each, with buttons that add one or take one away: with scripts at once, without them by sending the form. */
export function AskedRows({ rows, prefix, state }: Props) {
  const path = `${prefix}${rows.path}`;
  const count = rowsIn(state.typed.texts, prefix, rows);
  const error = state.faults.find((fault) => fault.path === path)?.message;
  return (
    <fieldset id={fieldId(path)} tabIndex={-1} className="space-y-3">
      <legend className="mb-1 font-semibold">{capital(rows.label)}</legend>
      {rows.help && <p className="text-base text-quiet">{rows.help}</p>}
      {error && <p className="text-base font-semibold text-kiln">{error}</p>}
      {Array.from({ length: count }, (_, i) => (
        <fieldset key={i} className="border border-rule bg-surface p-3">
          <legend className="label px-1">
            {capital(rows.one)} {i + 1}
          </legend>
          <div className="grid gap-3 sm:grid-cols-2">
            <AskedFields fields={rows.fields} prefix={`${path}.${i}.`} state={state} />
          </div>
          {count > rows.min && (
            <div className="no-print mt-3">
              <Button
                type="submit"
                variant="plain"
                name="remove"
                value={`${path}.${i}`}
                onClick={state.onRow}
                formNoValidate
              >
                Take away {rows.one} {i + 1}
              </Button>
            </div>
          )}
        </fieldset>
      ))}
      {count < rows.max && (
        <div className="no-print">
          <Button type="submit" variant="plain" name="add" value={path} onClick={state.onRow} formNoValidate>
            Add a {rows.one}
          </Button>
        </div>
      )}
    </fieldset>
  );
}
