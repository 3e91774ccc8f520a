import type { CubicMetresPerSecond, Metres, MetresPerSecond } from '@/lib/units/quantity';
import { aboveZero, finite, fromZeroUp } from './domain';

const CONSTANT = 1.4;

/**
 * Air drawn into a canopy open on all sides above a cold process: Q = 1.4 P D V.
 * Source: ACGIH Industrial Ventilation, 24th ed. (2001), hood-type figure and drawing VS-99-03.
 * @param velocity of the air curtain between work and canopy, m/s
 * @param distance height of the canopy above the work, m
 * @param perimeter of the work or tank, m
 * @returns m3/s
 * @throws RangeError for a negative, endless or overflowing amount
 */
export function canopyAirflow(velocity: MetresPerSecond, distance: Metres, perimeter: Metres) {
  fromZeroUp({ velocity, distance, perimeter });
  return finite(velocity * distance * perimeter * CONSTANT) as CubicMetresPerSecond;
}

/**
 * The same turned round: V = Q / (1.4 P D), in m/s.
 * @throws RangeError also for a height or perimeter of zero
 */
export function canopyVelocity(airflow: CubicMetresPerSecond, distance: Metres, perimeter: Metres) {
  fromZeroUp({ airflow });
  aboveZero({ distance, perimeter });
  return finite(airflow / CONSTANT / perimeter / distance) as MetresPerSecond;
}
