import type { Ask, FieldAsk, RowsAsk } from './fields';
import { fieldsOf } from './fields';
import { rowsIn, type Typed } from './typed';

/** The rows that a path with row numbers names, and the path they stand at. */
function rowsAt(fields: readonly FieldAsk[], path: string): RowsAsk | undefined {
  for (const field of fields) {
    if (field.as !== 'rows') continue;
    if (field.path === path) return field;
    const rest = new RegExp(`^${field.path.replaceAll('.', '\\.')}\\.\\d+\\.(.+)$`).exec(path)?.[1];
    const inner = rest && rowsAt(field.fields, rest);
    if (inner) return inner;
  }
  return undefined;
}

const firstNumber = (fields: readonly FieldAsk[]) => fields.find((field) => field.as !== 'rows')!;

/** The same question with one more, empty row at a path such as `runs.0.fittings`; as it was where there is no room for one. */
export function withRow(ask: Ask, typed: Typed, path: string): Typed {
  const rows = rowsAt(fieldsOf(ask), path);
  const prefix = path.slice(0, path.length - (rows?.path.length ?? 0));
  const count = rows ? rowsIn(typed.texts, prefix, rows) : 0;
  if (!rows || count >= rows.max) return typed;
  const texts = new Map(typed.texts);
  for (let i = 0; i <= count; i += 1) {
    const name = `${path}.${i}.${firstNumber(rows.fields).path}`;
    if (!texts.has(name)) texts.set(name, ['']);
  }
  return { ...typed, texts };
}

/** The same question without the row at a path such as `runs.1`; later ones move up. As it was where that many must be. */
export function withoutRow(ask: Ask, typed: Typed, path: string): Typed {
  const [, at, number] = /^(.+)\.(\d+)$/.exec(path) ?? [];
  const rows = at === undefined ? undefined : rowsAt(fieldsOf(ask), at);
  const prefix = at?.slice(0, at.length - (rows?.path.length ?? 0)) ?? '';
  if (!rows || rowsIn(typed.texts, prefix, rows) <= rows.min) return typed;
  const gone = Number(number);
  const texts = new Map<string, readonly string[]>();
  for (const [name, all] of typed.texts) {
    const [, index, rest] = name.startsWith(`${at}.`) ? (/^(\d+)(\..+)$/.exec(name.slice(at!.length + 1)) ?? []) : [];
    if (index === undefined) texts.set(name, all);
    else if (Number(index) !== gone) texts.set(`${at}.${Number(index) - (Number(index) > gone ? 1 : 0)}${rest}`, all);
  }
  return { ...typed, texts };
}
