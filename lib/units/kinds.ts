import {
  CFM,
  CUBIC_FOOT,
  FOOT,
  FPM,
  INCH,
  INCH_OF_WATER,
  POUND_PER_CUBIC_FOOT,
  SQUARE_FOOT,
  SQUARE_INCH,
} from './factors';

export const SYSTEMS = ['si', 'us'] as const;
export type System = (typeof SYSTEMS)[number];

/** A unit as written. A stored value is `size` times the written number, `zero` written units up the scale (0 °C is 32 °F). */
export type Unit = { symbol: string; size: number; zero?: number; also?: readonly string[] };

/**
 * The quantities a reader sees. Each is stored in its first unit: velocity m/s, airflow m3/s, length m, area m2, volume m3, pressure
 * Pa, temperature °C, density g/cm3 (as entries state it).
 */
export const UNITS = {
  velocity: [
    { symbol: 'm/s', size: 1, also: ['mps'] },
    { symbol: 'fpm', size: FPM, also: ['ft/min', 'feet per minute'] },
    { symbol: 'cm/s', size: 0.01 },
  ],
  airflow: [
    { symbol: 'm³/s', size: 1, also: ['m3/s'] },
    { symbol: 'm³/h', size: 1 / 3600, also: ['m3/h', 'm3/hr', 'cmh'] },
    { symbol: 'L/s', size: 0.001 },
    { symbol: 'cfm', size: CFM, also: ['ft3/min', 'ft³/min'] },
  ],
  length: [
    { symbol: 'm', size: 1 },
    { symbol: 'cm', size: 0.01 },
    { symbol: 'mm', size: 0.001 },
    { symbol: 'in', size: INCH, also: ['in.', '"', '″', 'inch', 'inches'] },
    { symbol: 'ft', size: FOOT, also: ["'", '′', 'foot', 'feet'] },
  ],
  area: [
    { symbol: 'm²', size: 1, also: ['m2'] },
    { symbol: 'cm²', size: 0.0001, also: ['cm2'] },
    { symbol: 'ft²', size: SQUARE_FOOT, also: ['ft2', 'sq ft'] },
    { symbol: 'in²', size: SQUARE_INCH, also: ['in2', 'sq in'] },
  ],
  volume: [
    { symbol: 'm³', size: 1, also: ['m3'] },
    { symbol: 'L', size: 0.001 },
    { symbol: 'ft³', size: CUBIC_FOOT, also: ['ft3', 'cu ft'] },
  ],
  pressure: [
    { symbol: 'Pa', size: 1 },
    { symbol: 'kPa', size: 1000 },
    { symbol: 'in. w.g.', size: INCH_OF_WATER, also: ['in w.g.', 'in wg', 'inwg', 'inh2o', 'in h2o', 'in. h2o'] },
  ],
  temperature: [
    { symbol: '°C', size: 1, also: ['c'] },
    { symbol: '°F', size: 5 / 9, zero: 32, also: ['f'] },
  ],
  density: [
    { symbol: 'g/cm³', size: 1, also: ['g/cm3'] },
    { symbol: 'kg/m³', size: 0.001, also: ['kg/m3'] },
    { symbol: 'lb/ft³', size: POUND_PER_CUBIC_FOOT / 1000, also: ['lb/ft3'] },
  ],
} as const satisfies Record<string, readonly Unit[]>;

export type Kind = keyof typeof UNITS;

/** The unit of that symbol; a symbol that is not of the kind is a fault of the caller. */
export function unitOf(kind: Kind, symbol: string): Unit {
  const unit = (UNITS[kind] as readonly Unit[]).find((each) => each.symbol === symbol);
  if (!unit) throw new RangeError(`${symbol} is no unit of ${kind}`);
  return unit;
}

/** A stored value in the given unit, and back. */
export const inUnit = (value: number, { size, zero = 0 }: Unit) => value / size + zero;
export const fromUnit = (written: number, { size, zero = 0 }: Unit) => (written - zero) * size;

/** The unit a typed number without one is read in. Lengths are typed in metres or inches, whatever size they are shown in. */
export const TYPED_UNITS: Record<Kind, Record<System, string>> = {
  velocity: { si: 'm/s', us: 'fpm' },
  airflow: { si: 'm³/h', us: 'cfm' },
  length: { si: 'm', us: 'in' },
  area: { si: 'm²', us: 'ft²' },
  volume: { si: 'm³', us: 'ft³' },
  pressure: { si: 'Pa', us: 'in. w.g.' },
  temperature: { si: '°C', us: '°F' },
  density: { si: 'g/cm³', us: 'lb/ft³' },
};
