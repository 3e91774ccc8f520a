import { Button } from '@/components/ui/button';
import { fieldId } from '@/components/forms/field-id';
import type { RowsAsk } from '@/lib/worksheets/ask/fields';
import { rowsIn } from '@/lib/worksheets/ask/typed';
import { AskedFields } from './field-of';
import type { FormState } from './form-state';

type Props = { rows: RowsAsk; prefix: string; state: FormState };

const withArticle = (word: string) => `${/^[aeiou]/.test(word) ? 'an' : 'a'} ${word}`;
const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

type RowProps = { rows: RowsAsk; path: string; number: number; removable: boolean; state: FormState };

/** One of them; where there are only two fields to it they stand in one line. */
function Row({ rows, path, number, removable, state }: RowProps) {
  const short = rows.fields.length <= 2;
  const landing = `#${fieldId(path.replace(/\.\d+$/, ''))}`;
  return (
    <fieldset className="border border-rule bg-surface p-3">
      <legend className="label px-1">
        {capital(rows.one)} {number}
      </legend>
      <div className={short ? 'grid items-end gap-3 sm:grid-cols-[1fr_1fr_auto]' : 'grid gap-3 sm:grid-cols-2'}>
        <AskedFields fields={rows.fields} prefix={`${path}.`} state={state} />
        {removable && (
          <div className={`no-print ${short ? '' : 'sm:col-span-2'}`}>
            <Button type="submit" name="remove" value={path} formAction={landing} onClick={state.onRow} formNoValidate>
              Take away{' '}
              <span className={short ? 'sr-only' : ''}>
                {rows.one} {number}
              </span>
            </Button>
          </div>
        )}
      </div>
    </fieldset>
  );
}

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
        <Row key={i} {...{ rows, state }} path={`${path}.${i}`} number={i + 1} removable={count > rows.min} />
      ))}
      {count < rows.max && (
        <div className="no-print">
          <Button
            {...{ type: 'submit', variant: 'plain', name: 'add', value: path, onClick: state.onRow }}
            formAction={`#${fieldId(path)}`}
            formNoValidate
          >
            Add {withArticle(rows.one)}
          </Button>
        </div>
      )}
    </fieldset>
  );
}
