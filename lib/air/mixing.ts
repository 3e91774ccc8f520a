import type { CubicMetresPerSecond } from '@/lib/units/quantity';
import { fromZeroUp } from './domain';

/**
 * How badly a room mixes, K: 1 is perfect, 10 very poor; it multiplies the airflow or the time. Another convention has a share of at
 * most 1 that multiplies the air changes: the two are never mixed here. Source: CDC, MMWR 1994;43(RR-13), Table S3-1.
 */
export const MIXING = { best: 1, worst: 10 } as const;

/** @throws RangeError below 1: that is a number of the other convention, and would make a bad room a good one */
export function fromOneUp(mixing: number): void {
  fromZeroUp({ mixing });
  if (mixing < MIXING.best) throw new RangeError('mixing must be at least 1: a share of 1 is the other convention');
}

/**
 * The part of an airflow that thins: Q' = Q / K, m3/s. Source: ACGIH Industrial Ventilation, 24th ed. (2001), ch. 2.
 * @throws RangeError for a negative or endless amount, or mixing below 1
 */
export function effectiveAirflow(airflow: CubicMetresPerSecond, mixing: number): CubicMetresPerSecond {
  fromZeroUp({ airflow });
  fromOneUp(mixing);
  return (airflow / mixing) as CubicMetresPerSecond;
}
