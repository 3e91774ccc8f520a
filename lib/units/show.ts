import { FOOT } from './factors';
import { inUnit, TYPED_UNITS, unitOf, type Kind, type System, type Unit } from './kinds';

/** What a page prints: a figure and its unit, apart because the unit is set smaller. */
export type Shown = { text: string; unit: string };
export type ShownKind = Kind | 'concentration';

const SUPERSCRIPT: Record<string, string> = Object.fromEntries(
  [...'0123456789-'].map((digit, i) => [digit, [...'⁰¹²³⁴⁵⁶⁷⁸⁹⁻'][i]!]),
);

/**
 * A number to three significant figures, without idle zeros: 0.508, 4480, 16.1. From ten thousand on the thousands are set apart by a
 * narrow space; below a ten-thousandth and from ten million on it is written as a power of ten. What is not finite is a dash.
 */
export function figure(value: number): string {
  if (!Number.isFinite(value)) return '—';
  const rounded = Number(value.toPrecision(3));
  const size = Math.abs(rounded);
  const sign = rounded < 0 ? '−' : '';
  if (size !== 0 && (size < 1e-4 || size >= 1e7)) {
    const [mantissa, exponent] = size.toExponential().split('e');
    return `${sign}${mantissa} × 10${[...exponent!.replace('+', '')].map((digit) => SUPERSCRIPT[digit]).join('')}`;
  }
  const plain = String(size);
  return sign + (size >= 1e4 ? plain.replace(/\B(?=(\d{3})+$)/g, '\u202f') : plain);
}

/** The unit a value is shown in. A length below 1 m is shown in mm, below 3 ft in inches. */
function shownUnit(kind: Kind, value: number, system: System): Unit {
  const size = Math.abs(value);
  if (kind === 'length' && system === 'si') return unitOf(kind, size < 1 ? 'mm' : 'm');
  if (kind === 'length') return unitOf(kind, size < 3 * FOOT ? 'in' : 'ft');
  return unitOf(kind, TYPED_UNITS[kind][system]);
}

/**
 * A stored value as the reader chose to see it, to three significant figures; the stored number is never changed.
 * @param value in the kind's stored unit: m/s, m3/s, m, m2, m3, Pa, °C, g/cm3
 * @param unit of a concentration, which passes through in the unit it carries
 */
export function show(kind: ShownKind, value: number, system: System, unit = ''): Shown {
  if (kind === 'concentration') return { text: figure(value), unit };
  const shown = shownUnit(kind, value, system);
  return { text: figure(inUnit(value, shown)), unit: shown.symbol };
}

/** Two ends of a range in one unit, that of the larger end; one figure where both round to the same. */
export function showRange(kind: ShownKind, min: number, max: number, system: System, unit = ''): Shown {
  const shown = kind === 'concentration' ? undefined : shownUnit(kind, Math.max(Math.abs(min), Math.abs(max)), system);
  const [low, high] = [min, max].map((value) => figure(shown ? inUnit(value, shown) : value));
  return { text: low === high ? low! : `${low}–${high}`, unit: shown?.symbol ?? unit };
}

/** Figure and unit in one line of text, a no-break space between them. */
export function told(kind: ShownKind, value: number, system: System, unit = ''): string {
  const shown = show(kind, value, system, unit);
  return shown.unit ? `${shown.text}\u00a0${shown.unit}` : shown.text;
}

/** Both systems at once, for a text that a reader of either may meet: 0.1 m/s (19.7 fpm). */
export const toldBoth = (kind: Kind, value: number) => `${told(kind, value, 'si')} (${told(kind, value, 'us')})`;
