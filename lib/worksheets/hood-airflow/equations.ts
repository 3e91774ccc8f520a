import type { HoodName } from '@/lib/air/hood-airflow';

const ACGIH = 'ACGIH Industrial Ventilation, 24th ed. (2001), hood-type figure, seen reprinted';

/** How each equation is written, which way round it gives the velocity, and where it is from. */
export type Equation = { airflow: string; velocity: string; source: string };

const published = (airflow: string, velocity: string, source = ACGIH): Equation => ({
  ...{ airflow, velocity, source },
});

export const EQUATIONS: Record<HoodName, Equation> = {
  'plain-opening': published('Q = V (10 X² + A)', 'V = Q / (10 X² + A)', `${ACGIH}; DallaValle, 1930s`),
  'flanged-opening': published('Q = 0.75 V (10 X² + A)', 'V = Q / (0.75 (10 X² + A))'),
  'bench-opening': {
    ...{ airflow: 'Q = V (5 X² + A)', velocity: 'V = Q / (5 X² + A)' },
    source: 'From memory; follows from the plain opening when the bench is taken as a mirror',
  },
  'plain-slot': published('Q = 3.7 L V X', 'V = Q / (3.7 L X)'),
  'flanged-slot': published('Q = 2.6 L V X', 'V = Q / (2.6 L X)'),
  enclosure: published('Q = V A', 'V = Q / A'),
  canopy: published('Q = 1.4 P D V', 'V = Q / (1.4 P D)', `${ACGIH}, and drawing VS-99-03`),
};

/** The letters, for whoever reads an equation without the page around it. SI in, SI out; the constants have no unit. */
export const LETTERS: Record<string, string> = {
  Q: 'airflow, m³/s',
  V: 'velocity at the source, m/s',
  X: 'distance of the source from the hood, m',
  A: 'area of the opening, m²',
  L: 'length of the slot, m',
  P: 'perimeter of the work, m',
  D: 'height of the canopy above the work, m',
};
