import type { CubicMetresPerSecond, MilligramsPerCubicMetre, MilligramsPerSecond } from '@/lib/units/quantity';
import { aboveZero, finite, fromZeroUp } from './domain';
import { fromOneUp } from './mixing';

/**
 * Air that holds an even release at a concentration: Q = K G / C, m3/s.
 * Source: mass balance; ACGIH Industrial Ventilation, 24th ed. (2001), ch. 2.
 * @param generation mg/s
 * @param concentration mg/m3
 * @throws RangeError for a negative or endless amount, no concentration, or mixing below 1
 */
export function dilutionAirflow(
  generation: MilligramsPerSecond,
  concentration: MilligramsPerCubicMetre,
  mixing = 1,
): CubicMetresPerSecond {
  fromZeroUp({ generation });
  aboveZero({ concentration });
  fromOneUp(mixing);
  return finite((mixing * generation) / concentration) as CubicMetresPerSecond;
}
