import type { CubicMetresPerSecond, Metres, MetresPerSecond, SquareMetres } from '@/lib/units/quantity';
import { finite } from './domain';
import { plainOpeningAirflow, plainOpeningVelocity } from './plain-opening';

/** What a flange leaves of the air a plain opening needs: it keeps out the air from behind. */
export const FLANGE_FACTOR = 0.75;

/**
 * Air drawn into an opening with a flange at least √A wide all round: Q = 0.75 V (10 X² + A). Holds where the plain equation holds.
 * Source: ACGIH Industrial Ventilation, 24th ed. (2001), hood-type figure.
 * @param velocity wanted at the source, m/s
 * @param distance of the source from the opening, m
 * @param area of the opening without its flange, m2
 * @returns m3/s
 * @throws RangeError for a negative, endless or overflowing amount
 */
export const flangedOpeningAirflow = (velocity: MetresPerSecond, distance: Metres, area: SquareMetres) =>
  (FLANGE_FACTOR * plainOpeningAirflow(velocity, distance, area)) as CubicMetresPerSecond;

/** The same turned round: V = Q / (0.75 (10 X² + A)), in m/s. */
export const flangedOpeningVelocity = (airflow: CubicMetresPerSecond, distance: Metres, area: SquareMetres) =>
  finite(plainOpeningVelocity(airflow, distance, area) / FLANGE_FACTOR) as MetresPerSecond;
