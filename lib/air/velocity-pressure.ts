import type { KilogramsPerCubicMetre, MetresPerSecond, Pascals } from '@/lib/units/quantity';
import { aboveZero, finite, fromZeroUp } from './domain';

/**
 * Velocity pressure: pv = ρ V² / 2, in Pa. In inches of water at 0.075 lb/ft3 it is (V / 4005)² with V in fpm.
 * Source: ACGIH Industrial Ventilation, 24th ed. (2001), ch. 1; ASHRAE Fundamentals (2021), ch. 21.
 * @throws RangeError for a negative or endless amount
 */
export function velocityPressure(velocity: MetresPerSecond, density: KilogramsPerCubicMetre): Pascals {
  fromZeroUp({ velocity, density });
  return finite((density * velocity ** 2) / 2) as Pascals;
}

/** The same turned round: V = √(2 pv / ρ), m/s. */
export function velocityOf(pressure: Pascals, density: KilogramsPerCubicMetre): MetresPerSecond {
  fromZeroUp({ pressure });
  aboveZero({ density });
  return finite(Math.sqrt((2 * pressure) / density)) as MetresPerSecond;
}
