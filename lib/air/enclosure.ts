import type { CubicMetresPerSecond, MetresPerSecond, SquareMetres } from '@/lib/units/quantity';
import { aboveZero, finite, fromZeroUp } from './domain';

/**
 * Air that keeps an inward velocity through every opening of an enclosure or booth: Q = V A.
 * Source: ACGIH Industrial Ventilation, 24th ed. (2001), hood-type figure.
 * @param velocity through the openings, m/s
 * @param openArea all open area together: doors, cable gaps, intake slots, m2
 * @returns m3/s
 * @throws RangeError for a negative, endless or overflowing amount
 */
export function enclosureAirflow(velocity: MetresPerSecond, openArea: SquareMetres) {
  fromZeroUp({ velocity, openArea });
  return finite(velocity * openArea) as CubicMetresPerSecond;
}

/**
 * Mean velocity through an opening: V = Q / A, in m/s. Holds for any face.
 * @throws RangeError also for an opening without an area
 */
export function faceVelocity(airflow: CubicMetresPerSecond, area: SquareMetres) {
  fromZeroUp({ airflow });
  aboveZero({ area });
  return finite(airflow / area) as MetresPerSecond;
}
