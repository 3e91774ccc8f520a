import type { CubicMetresPerSecond, Metres, MetresPerSecond, SquareMetres } from '@/lib/units/quantity';
import { aboveZero, finite, fromZeroUp } from './domain';

/**
 * Air drawn into a plain opening: Q = V (10 X² + A). The constant has no unit.
 * Holds on the centreline of a round opening, or of a rectangular one with height/width of at least 0.2, up to about 1.5 diameters
 * (the last from memory).
 * Source: DallaValle, 1930s; ACGIH Industrial Ventilation, 24th ed. (2001), hood-type figure.
 * @param velocity wanted at the source, m/s
 * @param distance of the source from the opening, m
 * @param area of the opening, m2
 * @returns m3/s
 * @throws RangeError for a negative, endless or overflowing amount
 */
export function plainOpeningAirflow(velocity: MetresPerSecond, distance: Metres, area: SquareMetres) {
  fromZeroUp({ velocity, distance, area });
  return finite(velocity * distance * distance * 10 + velocity * area) as CubicMetresPerSecond;
}

/**
 * The same turned round: V = Q / (10 X² + A), in m/s.
 * @throws RangeError also for an opening without an area
 */
export function plainOpeningVelocity(airflow: CubicMetresPerSecond, distance: Metres, area: SquareMetres) {
  fromZeroUp({ airflow, distance });
  aboveZero({ area });
  return finite(airflow / (10 * distance * distance + area)) as MetresPerSecond;
}
