import { done, refuse, type FieldFault, type Outcome } from '@/lib/outcome';
import type { System } from '@/lib/units/kinds';
import { parsePlain, parseQuantity, typedText } from '@/lib/units/parse-quantity';
import { fieldsOf, typedUnitOf, type Ask, type FieldAsk, type NumberAsk, type RowsAsk } from './fields';
import { eachField, rowsIn, type Typed } from './typed';

type Tree = { [key: string]: unknown };

/** Puts a value at a dotted path. */
function put(tree: Tree, path: string, value: unknown): void {
  const keys = path.split('.');
  const last = keys.pop()!;
  let at = tree;
  for (const key of keys) at = (at[key] ??= {}) as Tree;
  at[last] = value;
}

const read = (field: NumberAsk, text: string, system: System) =>
  field.kind ? parseQuantity(field.kind, text, system, typedUnitOf(field, system)) : parsePlain(text);

function build(fields: readonly FieldAsk[], typed: Typed, prefix: string, faults: FieldFault[]): Tree {
  const tree: Tree = {};
  for (const field of fields) {
    const path = `${prefix}${field.path}`;
    const texts = typed.texts.get(path)?.filter((text) => text !== '') ?? [];
    if (field.as === 'rows') {
      const count = rowsIn(typed.texts, prefix, field);
      if (count > 0) put(tree, field.path, builtRows(field, count, typed, path, faults));
    } else if (texts.length === 0) continue;
    else if (field.as === 'checks') put(tree, field.path, texts);
    else if (field.as !== 'number') put(tree, field.path, texts[0]);
    else {
      const number = read(field, texts[0]!, typed.units);
      if (number.ok) put(tree, field.path, number.value);
      else faults.push({ path, message: number.message });
    }
  }
  return tree;
}

const builtRows = (rows: RowsAsk, count: number, typed: Typed, path: string, faults: FieldFault[]) =>
  Array.from({ length: count }, (_, i) => build(rows.fields, typed, `${path}.${i}.`, faults));

/**
 * The request a typed question makes, in SI, as it would go over the wire.
 * @returns the request, not yet admitted by its schema, or the fields that hold no number
 */
export function requestFrom(ask: Ask, typed: Typed): Outcome<Tree> {
  const faults: FieldFault[] = [];
  const request = build(fieldsOf(ask), typed, '', faults);
  for (const part of ask.parts ?? []) request[part] ??= {};
  return faults.length > 0 ? refuse(422, 'Not a number', 'A field holds no number.', faults) : done(request);
}

const inSystem = (field: NumberAsk, value: number, system: System) =>
  field.kind ? typedText(field.kind, value, system, typedUnitOf(field, system)) : String(value);

function write(
  fields: readonly FieldAsk[],
  tree: Tree,
  prefix: string,
  units: System,
  texts: Map<string, string[]>,
): void {
  for (const field of fields) {
    const value = field.path.split('.').reduce<unknown>((at, key) => (at as Tree | undefined)?.[key], tree);
    const path = `${prefix}${field.path}`;
    if (value === undefined || value === null) continue;
    if (field.as === 'rows')
      (value as Tree[]).forEach((row, i) => write(field.fields, row, `${path}.${i}.`, units, texts));
    else if (field.as === 'number') texts.set(path, [inSystem(field, value as number, units)]);
    else texts.set(path, [value].flat().map(String));
  }
}

/** A request as it would be typed, its numbers in the given units. */
export function typedOf(ask: Ask, request: object, units: System = 'si'): Typed {
  const texts = new Map<string, string[]>();
  write(fieldsOf(ask), request as Tree, '', units, texts);
  return { units, texts };
}

/** The same question with its numbers in another system; a text that holds no number stays as it is. */
export function inUnits(ask: Ask, typed: Typed, units: System): Typed {
  if (units === typed.units) return typed;
  const texts = new Map(typed.texts);
  eachField(fieldsOf(ask), typed.texts, (field, path) => {
    const text = typed.texts.get(path)?.[0];
    if (field.as !== 'number' || !field.kind || !text) return;
    const number = read(field, text, typed.units);
    if (number.ok) texts.set(path, [inSystem(field, number.value, units)]);
  });
  return { units, texts };
}
