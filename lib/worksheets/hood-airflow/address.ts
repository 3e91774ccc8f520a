import { HOODS, type HoodName } from '@/lib/air/hood-airflow';
import { done, refuse, type FieldFault, type Outcome } from '@/lib/outcome';
import { SYSTEMS, type System } from '@/lib/units/kinds';
import { parseQuantity, typedText } from '@/lib/units/parse-quantity';
import { FIELDS_OF, kindOf, NUMBERS, typedUnitOf, WORK, type NumberField, type Work } from './fields';
import type { HoodQuestion } from './schema';

/** The question as it was typed: texts as they stand in the address, so that a mistake can be shown and mended. */
export type Typed = { hood: string; work: Work[]; units: System } & Partial<Record<NumberField, string>>;

/** Longer than any number: what is beyond is cut, so that an address cannot fill a page. */
const MAX_KEPT = 60;
export const HOOD_ADDRESS = '/worksheets/hood-airflow';
export const HOOD_API = '/api/worksheets/hood-airflow';

const isHood = (text: string): text is HoodName => (HOODS as readonly string[]).includes(text);
const systemOf = (text: string | null): System => SYSTEMS.find((system) => system === text) ?? 'si';

/** Reads the address of the page, or a form; what it does not know is left alone. Bare numbers without `units` are SI. */
export function typedFrom(address: URLSearchParams): Typed {
  const numbers = NUMBERS.map((field) => [field, address.get(field)?.slice(0, MAX_KEPT)] as const);
  return {
    hood: address.get('hood')?.slice(0, MAX_KEPT) ?? '',
    work: WORK.filter((each) => address.getAll('work').includes(each)),
    units: systemOf(address.get('units')),
    ...Object.fromEntries(numbers.filter(([, text]) => text !== undefined && text.trim() !== '')),
  };
}

/** True when nothing was asked yet. */
export const isBlank = (typed: Typed) => typed.hood === '' && NUMBERS.every((field) => typed[field] === undefined);

/** The typed numbers that the hood is reckoned from; what belongs to another hood stays in the form and out of the question. */
const usedBy = (typed: Typed) =>
  (isHood(typed.hood) ? FIELDS_OF[typed.hood] : NUMBERS).filter((field) => typed[field] !== undefined);

/**
 * The request a typed question makes, in SI, as it would go over the wire.
 * @returns the request, not yet admitted by the schema, or the fields that hold no number
 */
export function requestFrom(typed: Typed): Outcome<Record<string, unknown>> {
  const request: Record<string, unknown> = typed.hood === '' ? {} : { hood: typed.hood };
  const faults: FieldFault[] = [];
  for (const field of usedBy(typed)) {
    const read = parseQuantity(kindOf(field), typed[field]!, typed.units, typedUnitOf(field, typed.units));
    if (read.ok) request[field] = read.value;
    else faults.push({ path: field, message: read.message });
  }
  if (typed.work.length > 0) request.work = typed.work;
  return faults.length > 0 ? refuse(422, 'Not a number', 'A field holds no number.', faults) : done(request);
}

/**
 * The address of a typed question: every text as it stands. Without `named` units its numbers must be SI, and whoever opens it sees
 * them in the units they chose.
 */
export function addressOf(typed: Typed, named = true): string {
  const address = new URLSearchParams();
  if (typed.hood) address.set('hood', typed.hood);
  for (const field of NUMBERS) if (typed[field] !== undefined) address.set(field, typed[field]);
  for (const each of typed.work) address.append('work', each);
  if (named) address.set('units', typed.units);
  return `${HOOD_ADDRESS}?${address}`;
}

/** The same question with its numbers in another system; a text that holds no number stays as it is. */
export function inUnits(typed: Typed, units: System): Typed {
  const changed = { ...typed, units };
  for (const field of NUMBERS) {
    const text = typed[field];
    if (text === undefined || units === typed.units) continue;
    const read = parseQuantity(kindOf(field), text, typed.units, typedUnitOf(field, typed.units));
    if (read.ok) changed[field] = typedText(kindOf(field), read.value, units, typedUnitOf(field, units));
  }
  return changed;
}

/** The typed form of a question in SI, in the reader's units. */
export function typedOf(question: Partial<HoodQuestion>, units: System = 'si'): Typed {
  const typed: Typed = { hood: question.hood ?? '', work: question.work ?? [], units };
  for (const field of NUMBERS) {
    const value = question[field];
    if (value !== undefined) typed[field] = typedText(kindOf(field), value, units, typedUnitOf(field, units));
  }
  return typed;
}

/** The address of the table of a typed question, for a spreadsheet. */
export const tableAddressOf = (typed: Typed) => addressOf(typed).replace(HOOD_ADDRESS, `${HOOD_API}/table.csv`);
