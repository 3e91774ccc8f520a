import { SYSTEMS, type System } from '@/lib/units/kinds';
import type { Ask, FieldAsk, RowsAsk } from './fields';
import { fieldsOf } from './fields';

/** Longer than any number or name that is taken: what is beyond is cut, so that an address cannot fill a page. */
export const MAX_KEPT = 80;
/** Entries of an address that are looked at. */
const MAX_ENTRIES = 1200;

/** A question as it was typed: the texts of the form by their path, in the order of the form. */
export type Typed = { units: System; texts: ReadonlyMap<string, readonly string[]> };

const systemOf = (text: string | null): System => SYSTEMS.find((system) => system === text) ?? 'si';

/** How many rows are written at a path: one more than the highest number, and at least as many as must be. */
export function rowsIn(texts: Typed['texts'], prefix: string, { path, min, max }: RowsAsk): number {
  const start = `${prefix}${path}.`;
  let count = min;
  for (const name of texts.keys())
    if (name.startsWith(start)) count = Math.max(count, Number(/^\d+/.exec(name.slice(start.length))?.[0] ?? -1) + 1);
  return Math.min(count, max);
}

/** Calls `visit` for each field that is no rows, with its full path. */
export function eachField(
  fields: readonly FieldAsk[],
  texts: Typed['texts'],
  visit: (field: Exclude<FieldAsk, RowsAsk>, path: string) => void,
  prefix = '',
): void {
  for (const field of fields)
    if (field.as === 'rows')
      for (let i = 0; i < rowsIn(texts, prefix, field); i += 1)
        eachField(field.fields, texts, visit, `${prefix}${field.path}.${i}.`);
    else visit(field, `${prefix}${field.path}`);
}

/** Reads an address or a form; what the worksheet does not ask is left alone. */
export function typedFrom(ask: Ask, address: URLSearchParams): Typed {
  const given = new Map<string, string[]>();
  for (const [name, text] of [...address].slice(0, MAX_ENTRIES))
    if (text.trim() !== '' || /\.\d+\./.test(name))
      given.set(name, [...(given.get(name) ?? []), text.trim().slice(0, MAX_KEPT)]);
  const texts = new Map<string, readonly string[]>();
  eachField(fieldsOf(ask), given, (field, path) => {
    const here = given.get(path);
    if (here) texts.set(path, field.as === 'checks' ? here : here.slice(0, 1));
  });
  return { units: systemOf(address.get('units')), texts };
}

/** True when nothing was asked yet: no text stands anywhere. */
export const isBlank = ({ texts }: Typed) => [...texts.values()].every((all) => all.every((text) => text === ''));

/** The address parameters of a typed question: every text as it stands. */
export function paramsOf({ units, texts }: Typed): URLSearchParams {
  const params = new URLSearchParams();
  for (const [path, all] of texts) for (const text of all) params.append(path, text);
  params.set('units', units);
  return params;
}
