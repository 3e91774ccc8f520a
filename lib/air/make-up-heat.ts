import type { Celsius, CubicMetresPerSecond, KilogramsPerCubicMetre, Watts } from '@/lib/units/quantity';
import { finite, fromZeroUp } from './domain';

/** Specific heat of dry air, J/(kg K). Source: ASHRAE Fundamentals (2021), ch. 1. */
export const SPECIFIC_HEAT = 1006;

/**
 * Heat that brings the air let in to the temperature of the room: P = ρ Q cp (t indoors − t outdoors), W; negative where it cools.
 * Source: ASHRAE Fundamentals (2021), ch. 17.
 * @throws RangeError for a negative or endless amount
 */
export function makeUpHeat(
  airflow: CubicMetresPerSecond,
  density: KilogramsPerCubicMetre,
  indoor: Celsius,
  outdoor: Celsius,
): Watts {
  fromZeroUp({ airflow, density });
  return finite(density * airflow * SPECIFIC_HEAT * (indoor - outdoor)) as Watts;
}
