import type { CubicMetresPerSecond, Metres, MetresPerSecond, SquareMetres } from '@/lib/units/quantity';
import { aboveZero, finite, fromZeroUp } from './domain';

/**
 * Air drawn into an opening that rests on a bench or the floor: Q = V (5 X² + A).
 * Source: from memory. It follows from the plain opening by image symmetry: the bench is a mirror, so hood and image together are a
 * plain opening of area 2A, and the hood itself draws half of that.
 * @param velocity wanted at the source, m/s
 * @param distance of the source from the opening, m
 * @param area of the opening, m2
 * @returns m3/s
 * @throws RangeError for a negative, endless or overflowing amount
 */
export function benchOpeningAirflow(velocity: MetresPerSecond, distance: Metres, area: SquareMetres) {
  fromZeroUp({ velocity, distance, area });
  return finite(velocity * distance * distance * 5 + velocity * area) as CubicMetresPerSecond;
}

/**
 * The same turned round: V = Q / (5 X² + A), in m/s.
 * @throws RangeError also for an opening without an area
 */
export function benchOpeningVelocity(airflow: CubicMetresPerSecond, distance: Metres, area: SquareMetres) {
  fromZeroUp({ airflow, distance });
  aboveZero({ area });
  return finite(airflow / (5 * distance * distance + area)) as MetresPerSecond;
}
