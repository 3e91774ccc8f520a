import type { CubicMetresPerSecond, Metres, MetresPerSecond } from '@/lib/units/quantity';
import { aboveZero, finite, fromZeroUp } from './domain';

const CONSTANT = 2.6;

/**
 * Air drawn into a slot with a flange: Q = 2.6 L V X. The constant has no unit.
 * Holds for a slot at most a fifth as high as it is long; does not join the opening's equation there, since the two describe
 * different shapes.
 * Source: ACGIH Industrial Ventilation, 24th ed. (2001), hood-type figure.
 * @param velocity wanted at the source, m/s
 * @param distance of the source from the slot, m
 * @param length of the slot, m
 * @returns m3/s
 * @throws RangeError for a negative, endless or overflowing amount
 */
export function flangedSlotAirflow(velocity: MetresPerSecond, distance: Metres, length: Metres) {
  fromZeroUp({ velocity, distance, length });
  return finite(velocity * distance * length * CONSTANT) as CubicMetresPerSecond;
}

/**
 * The same turned round: V = Q / (2.6 L X), in m/s. Divided one by one, so that no product underflows to nothing.
 * @throws RangeError also for a distance or length of zero
 */
export function flangedSlotVelocity(airflow: CubicMetresPerSecond, distance: Metres, length: Metres) {
  fromZeroUp({ airflow });
  aboveZero({ distance, length });
  return finite(airflow / CONSTANT / length / distance) as MetresPerSecond;
}
