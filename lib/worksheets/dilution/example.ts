import type { DilutionQuestion } from './schema';

/** A question to look at before one's own: isopropanol from an invented bench, against a limit of 400 ppm (OSHA, NIOSH). */
export const DILUTION_EXAMPLE: DilutionQuestion = {
  generation: { liquidRate: 0.06, specificGravity: 0.786, molarMass: 60.1 },
  limit: { value: 400, unit: 'ppm' },
  mixingFactor: 5,
};
