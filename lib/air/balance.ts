import type { CubicMetresPerSecond, Pascals } from '@/lib/units/quantity';
import { aboveZero, finite, fromZeroUp } from './domain';

/**
 * Velocity pressure where two branches have become one: (Q1 pv1 + Q2 pv2) / (Q1 + Q2), in Pa.
 * Source: ACGIH Industrial Ventilation, 24th ed. (2001), ch. 5.
 * @throws RangeError for a negative or endless amount, or no air at all
 */
export function mergedVelocityPressure(branches: { airflow: CubicMetresPerSecond; pressure: Pascals }[]): Pascals {
  for (const { airflow, pressure } of branches) fromZeroUp({ airflow, pressure });
  const total = branches.reduce((sum, { airflow }) => sum + airflow, 0);
  aboveZero({ airflow: total });
  return finite(branches.reduce((sum, { airflow, pressure }) => sum + airflow * pressure, 0) / total) as Pascals;
}

/**
 * What a branch draws once it has the suction of the harder one: Q √(P high / P low), in m3/s.
 * Source: ACGIH Industrial Ventilation, 24th ed. (2001), ch. 5.
 * @throws RangeError for a negative or endless amount
 */
export function correctedAirflow(airflow: CubicMetresPerSecond, high: Pascals, low: Pascals): CubicMetresPerSecond {
  fromZeroUp({ airflow, high });
  aboveZero({ low });
  return finite(airflow * Math.sqrt(high / low)) as CubicMetresPerSecond;
}

/**
 * Static pressure of a fan as catalogues mean it: SP outlet − SP inlet − pv inlet, in Pa, with their signs (suction is negative).
 * Source: ACGIH Industrial Ventilation, 24th ed. (2001), ch. 6.
 */
export const fanStaticPressure = (outlet: Pascals, inlet: Pascals, velocityPressureInlet: Pascals) =>
  finite(outlet - inlet - velocityPressureInlet) as Pascals;
