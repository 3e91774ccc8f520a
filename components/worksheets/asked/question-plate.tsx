import { told } from '@/lib/units/show';
import { fieldsOf, typedUnitOf, type Ask, type FieldAsk, type RowsAsk } from '@/lib/worksheets/ask/fields';
import { requestFrom } from '@/lib/worksheets/ask/request';
import { eachField, type Typed } from '@/lib/worksheets/ask/typed';
import { fieldAt } from '@/lib/worksheets/ask/fields';

type Plain = Exclude<FieldAsk, RowsAsk>;

function wordsOf(field: Plain, texts: readonly string[], typed: Typed): string {
  if (field.as === 'choice' || field.as === 'checks')
    return texts.map((text) => field.options.find(({ value }) => value === text)?.label ?? text).join('; ');
  if (field.as === 'text') return texts[0]!;
  if (!field.kind) return texts[0]!;
  const ask: Ask = { name: '', groups: [{ title: '', fields: [{ ...field, path: 'it' }] }] };
  const read = requestFrom(ask, { units: typed.units, texts: new Map([['it', texts]]) });
  return read.ok
    ? told(field.kind, read.value.it as number, typed.units)
    : `${texts[0]} ${typedUnitOf(field, typed.units)}`;
}

/** What was asked, on paper only, so that an answer still says of what. */
export function AskedPlate({ ask, typed }: { ask: Ask; typed: Typed }) {
  const lines: { path: string; label: string; words: string }[] = [];
  eachField(fieldsOf(ask), typed.texts, (field, path) => {
    const texts = typed.texts.get(path)?.filter(Boolean) ?? [];
    const rows = fieldAt(fieldsOf(ask), path)?.rows;
    if (texts.length > 0)
      lines.push({ path, label: rows ? `${rows}: ${field.label}` : field.label, words: wordsOf(field, texts, typed) });
  });
  return (
    <dl className="print-only">
      {lines.map(({ path, label, words }) => (
        <div key={path} className="flex gap-3">
          <dt className="label first-letter:uppercase">{label}</dt>
          <dd className="figure">{words}</dd>
        </div>
      ))}
    </dl>
  );
}
