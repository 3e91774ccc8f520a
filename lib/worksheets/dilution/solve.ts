import { dilutionAirflow } from '@/lib/air/dilution';
import { evaporatedMass, evaporationAirflow } from '@/lib/air/evaporation';
import { effectiveAirflow } from '@/lib/air/mixing';
import { massFromPpm } from '@/lib/chemistry/concentration';
import { HOUR } from '@/lib/units/factors';
import {
  gramsPerMole,
  milligramsPerCubicMetre,
  milligramsPerSecond,
  type CubicMetresPerSecond,
  type MilligramsPerCubicMetre,
  type MilligramsPerSecond,
} from '@/lib/units/quantity';
import type { Answer } from '@/lib/worksheets/worksheet';
import type { DilutionQuestion, DilutionResult } from './schema';
import { dilutionWarnings } from './warnings';
import { dilutionSteps } from './working';

/** The airflow, and the masses it was reckoned from unless it came from volumes. */
export type Held = {
  airflow: CubicMetresPerSecond;
  generation?: MilligramsPerSecond;
  concentration?: MilligramsPerCubicMetre;
};

/** A liquid against a limit in ppm goes by volumes, in the trade's own equation; all else by masses. */
function heldBy({ generation: of, limit, molarMass = 1, mixingFactor }: DilutionQuestion): Held {
  const { massRate, liquidRate = 0, specificGravity = 0 } = of;
  const rate = liquidRate / HOUR;
  const isPpm = limit.unit === 'ppm';
  if (massRate === undefined && isPpm) {
    const mass = gramsPerMole(of.molarMass ?? 1);
    return { airflow: evaporationAirflow(rate, specificGravity, mass, limit.value, mixingFactor) };
  }
  const generation = massRate === undefined ? evaporatedMass(rate, specificGravity) : milligramsPerSecond(massRate);
  const concentration = isPpm
    ? massFromPpm(limit.value, gramsPerMole(molarMass))
    : milligramsPerCubicMetre(limit.value);
  return { airflow: dilutionAirflow(generation, concentration, mixingFactor), generation, concentration };
}

/**
 * Clean air that thins a steady release to a limit. SI in, SI out.
 * @param question admitted by `dilutionRequest`; sources of the equations stand in lib/air and in the steps
 */
export function solveDilution(question: DilutionQuestion): Answer<DilutionResult> {
  const held = heldBy(question);
  const { airflow } = held;
  const result = { airflow, perfectMixing: effectiveAirflow(airflow, question.mixingFactor) };
  return {
    result,
    steps: dilutionSteps(question, held, result),
    warnings: dilutionWarnings(question, result),
  };
}
