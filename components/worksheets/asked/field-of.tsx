import { Field } from '@/components/forms/field';
import { MAX_TYPED } from '@/lib/units/parse-quantity';
import { typedUnitOf, type ChoiceAsk, type FieldAsk, type RowsAsk } from '@/lib/worksheets/ask/fields';
import { MAX_KEPT } from '@/lib/worksheets/ask/typed';
import type { FormState } from './form-state';
import { AskedRows } from './rows';
import { CHOOSE, Ticks } from './ticks';

/** Choices are drawn open up to that many; within rows, where space is short, never. */
const MAX_OPEN = 5;
const isShort = (field: ChoiceAsk, path: string) => field.options.length <= MAX_OPEN && !/\.\d+\./.test(path);
const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

function Choice({ field, path, state, error }: { field: ChoiceAsk; path: string; state: FormState; error?: string }) {
  return (
    <Field name={path} label={capital(field.label)} hint={field.help} error={error}>
      {(control) => (
        <select {...control} defaultValue={state.typed.texts.get(path)?.[0] ?? ''} className="input">
          <option value="">{field.first ?? CHOOSE}</option>
          {field.options.map(({ value, label }) => (
            <option key={value} value={value}>
              {label}
            </option>
          ))}
        </select>
      )}
    </Field>
  );
}

type Props = { field: Exclude<FieldAsk, RowsAsk>; path: string; state: FormState };

function Plain({ field, path, state }: Props) {
  const error = state.faults.find((fault) => fault.path === path)?.message;
  if (field.as === 'checks' || (field.as === 'choice' && isShort(field, path)))
    return <Ticks {...{ field, path, state, error }} label={capital(field.label)} />;
  if (field.as === 'choice') return <Choice {...{ field, path, state, error }} />;
  const unit = field.as === 'number' ? typedUnitOf(field, state.typed.units) : undefined;
  return (
    <Field
      name={path}
      label={`${capital(field.label)}${unit ? ` (${unit})` : ''}`}
      hint={field.help}
      error={error}
      defaultValue={state.typed.texts.get(path)?.[0]}
      inputMode={field.as === 'number' ? 'decimal' : undefined}
      autoComplete="off"
      maxLength={field.as === 'number' ? MAX_TYPED : MAX_KEPT}
    />
  );
}

/** Fields one after another, rows among them, each with its unit, help and error. */
export function AskedFields({
  fields,
  prefix = '',
  state,
}: {
  fields: readonly FieldAsk[];
  prefix?: string;
  state: FormState;
}) {
  return fields.map((field) => {
    const path = `${prefix}${field.path}`;
    const wide = field.as === 'rows' || field.as === 'checks' || (field.help?.length ?? 0) > 60;
    return (
      <div key={field.path} className={wide ? 'sm:col-span-2' : 'min-w-0'}>
        {field.as === 'rows' ? (
          <AskedRows {...{ rows: field, prefix, state }} />
        ) : (
          <Plain {...{ field, path, state }} />
        )}
      </div>
    );
  });
}
