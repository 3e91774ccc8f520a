import type { DuctPressureQuestion } from './schema';

/** A question to look at before one's own. The duct is invented. */
export const DUCT_PRESSURE_EXAMPLE: DuctPressureQuestion = {
  airflow: 0.14,
  hood: { entryLossFactor: 0.49 },
  runs: [
    { duct: 'flexible-stretched', diameter: 0.125, length: 1.5 },
    { duct: 'galvanised-steel', diameter: 0.125, length: 6, fittings: [{ fitting: 'elbow-90-r1.5', count: 3 }] },
  ],
  outlet: { k: 0.1 },
};
