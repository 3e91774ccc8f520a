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
/** `parts` are the objects that a request always has, even with nothing filled in: only then can it be told what each lacks. */
export type Ask = { name: string; groups: readonly GroupAsk[]; parts?: readonly string[] };

/** The unit that a bare number in a field has; undefined where it has none. */
export const typedUnitOf = ({ kind, unit }: NumberAsk, system: System): string | undefined =>
  unit?.[system] ?? (kind && TYPED_UNITS[kind][system]);

export const fieldsOf = (ask: Ask): FieldAsk[] => ask.groups.flatMap(({ fields }) => fields);

/** A field, its full path, and which row of which rows it is in. */
export type Found = { field: FieldAsk; path: string; rows: string };

const isTick = (field: FieldAsk, path: string) =>
  field.as === 'checks' && path.startsWith(`${field.path}.`) && /^\d+$/.test(path.slice(field.path.length + 1));

function within(field: RowsAsk, path: string): Found | undefined {
  const [, index, rest] = /^(\d+)(?:\.(.+))?$/.exec(path.slice(field.path.length + 1)) ?? [];
  if (index === undefined) return undefined;
  const place = `${field.one} ${Number(index) + 1}`;
  if (rest === undefined) return { field, path: field.path, rows: place };
  const inner = fieldAt(field.fields, rest);
  return (
    inner && {
      field: inner.field,
      path: `${field.path}.${index}.${inner.path}`,
      rows: inner.rows ? `${place}, ${inner.rows}` : place,
    }
  );
}

/**
 * The field that a dotted path with row numbers leads to. One of several ticks leads to them all, and an object that is more than one
 * field (`hood`) to the first of its fields.
 */
export function fieldAt(fields: readonly FieldAsk[], path: string): Found | undefined {
  for (const field of fields) {
    if (field.path === path || isTick(field, path)) return { field, path: field.path, rows: '' };
    const inner = field.as === 'rows' && path.startsWith(`${field.path}.`) ? within(field, path) : undefined;
    if (inner) return inner;
  }
  const first = fields.find((field) => field.path.startsWith(`${path}.`));
  return first && { field: first, path: first.path, rows: '' };
}
