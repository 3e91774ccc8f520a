import { fromUnit, inUnit, TYPED_UNITS, UNITS, unitOf, type Kind, type System, type Unit } from './kinds';

/** What a person may type for one number; a longer text is not one. */
export const MAX_TYPED = 40;

export type Parsed = { ok: true; value: number } | { ok: false; message: string };

const NUMBER = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d{1,3})?/i;
const no = (message: string): Parsed => ({ ok: false, message });

function unitNamed(kind: Kind, name: string): Unit | undefined {
  const wanted = name.toLowerCase();
  return (UNITS[kind] as readonly Unit[]).find((unit) =>
    [unit.symbol, ...(unit.also ?? [])].some((each) => each.toLowerCase() === wanted),
  );
}

/**
 * Reads a typed quantity: a number with a decimal point, with or without a unit of its kind.
 * @param system decides the unit of a bare number (see TYPED_UNITS) unless `bare` names one
 * @returns the value in the kind's stored unit, or what to write instead
 */
export function parseQuantity(kind: Kind, text: string, system: System, bare = TYPED_UNITS[kind][system]): Parsed {
  const typed = text
    .replace(/[\s\u202f\u2009\u00a0]+/g, ' ')
    .replace(/^[−–]/, '-')
    .trim();
  if (typed === '') return no('Write a number.');
  if (typed.length > MAX_TYPED) return no('That is too long for a number.');
  if (/\d,\d/.test(typed)) return no('Write a decimal point and no commas: 0.5, 1200.');
  const digits = typed.replace(/(?<=^[+-]?[\d ]*\d) (?=\d{3}(?!\d))/g, '');
  const number = NUMBER.exec(digits)?.[0];
  if (!number) return no('Write a number, such as 0.3.');
  const name = digits.slice(number.length).trim();
  const unit = name === '' ? unitOf(kind, bare) : unitNamed(kind, name);
  if (!unit) return no(`“${name}” is not understood here. Write ${UNITS[kind].map((each) => each.symbol).join(', ')}.`);
  const value = fromUnit(Number(number), unit);
  return Number.isFinite(value) ? { ok: true, value } : no('That number is too large.');
}

/** Reads a typed number that has no unit. */
export function parsePlain(text: string): Parsed {
  const typed = text.trim().replace(/^[−–]/, '-');
  if (typed === '') return no('Write a number.');
  if (typed.length > MAX_TYPED) return no('That is too long for a number.');
  if (/\d,\d/.test(typed)) return no('Write a decimal point and no commas: 0.5, 1200.');
  const value = NUMBER.exec(typed)?.[0] === typed ? Number(typed) : NaN;
  return Number.isFinite(value) ? { ok: true, value } : no('Write a number, such as 0.3.');
}

/** A stored value as text for an input, to five significant figures so that a change of units and back returns what was typed. */
export function typedText(kind: Kind, value: number, system: System, unit = TYPED_UNITS[kind][system]): string {
  return String(Number(inUnit(value, unitOf(kind, unit)).toPrecision(5)));
}
