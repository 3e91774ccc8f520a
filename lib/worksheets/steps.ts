import type { Step } from './worksheet';

/** A number as it is written in the working: four figures, as they are. */
export const n = (value: number) => String(Number(value.toPrecision(4)));

/** One line of the working. */
export const step = (label: string, equation: string, value: number, unit: string, source: string): Step => ({
  ...{ label, equation, value, unit, source },
});

export const GEOMETRY = 'Geometry';
export const CONTINUITY = 'Continuity: mean velocity is airflow over area';
export const ACGIH = 'ACGIH Industrial Ventilation, 24th ed. (2001)';
export const ASHRAE_DUCT = 'ASHRAE Fundamentals (2021), ch. 21 Duct Design';
export const PRACTICE = 'Common practice, no source';
