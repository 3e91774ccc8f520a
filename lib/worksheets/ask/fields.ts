import { TYPED_UNITS, type Kind, type System } from '@/lib/units/kinds';

/*
 * How a worksheet asks, as data: a page draws its form from it, and an address is read and written by it. Paths are dotted as in the
 * request; within rows they begin at the row.
 */
type Common = { path: string; label: string; help?: string };

/** A number; without a kind it has no unit. `unit` is what a bare one is typed in, where that is not the usual one of the kind. */
export type NumberAsk = Common & { as: 'number'; kind?: Kind; unit?: Record<System, string> };
export type Option = { value: string; label: string };
/** One of some words. `first` is what stands there until something is chosen. */
export type ChoiceAsk = Common & { as: 'choice'; options: readonly Option[]; first?: string };
/** Any of some words: the request has those that are ticked. */
export type ChecksAsk = Common & { as: 'checks'; options: readonly Option[] };
export type TextAsk = Common & { as: 'text' };
/** Alike things, one row each; `one` is what one is called. */
export type RowsAsk = Common & { as: 'rows'; one: string; min: number; max: number; fields: readonly FieldAsk[] };

export type FieldAsk = NumberAsk | ChoiceAsk | ChecksAsk | TextAsk | RowsAsk;
/** Fields under one heading; `folded` ones are behind a click until one of them is filled in. */
export type GroupAsk = { title: string; help?: string; folded?: boolean; fields: readonly FieldAsk[] };
export type Ask = { name: string; groups: readonly GroupAsk[] };

/** The unit that a bare number in a field has; undefined where it has none. */
export const typedUnitOf = ({ kind, unit }: NumberAsk, system: System): string | undefined =>
  unit?.[system] ?? (kind && TYPED_UNITS[kind][system]);

export const fieldsOf = (ask: Ask): FieldAsk[] => ask.groups.flatMap(({ fields }) => fields);

/** The field that a dotted path with row numbers leads to, and which row of which rows it is in. */
export function fieldAt(fields: readonly FieldAsk[], path: string): { field: FieldAsk; rows: string } | undefined {
  for (const field of fields) {
    if (field.path === path) return { field, rows: '' };
    if (field.as !== 'rows' || !path.startsWith(`${field.path}.`)) continue;
    const [, index, rest] = /^(\d+)(?:\.(.+))?$/.exec(path.slice(field.path.length + 1)) ?? [];
    if (index === undefined) continue;
    const place = `${field.one} ${Number(index) + 1}`;
    const inner = rest === undefined ? { field, rows: '' } : fieldAt(field.fields, rest);
    if (inner) return { field: inner.field, rows: inner.rows ? `${place}, ${inner.rows}` : place };
  }
  return undefined;
}
