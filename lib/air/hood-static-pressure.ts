import type { Pascals } from '@/lib/units/quantity';
import { aboveZero, finite, fromZeroUp } from './domain';

/**
 * Suction just behind a hood: SPh = (1 + F) pv, in Pa, as a magnitude. The 1 sets the air in motion, F is what the entry loses.
 * Source: ACGIH Industrial Ventilation, 24th ed. (2001), ch. 3.
 * @param entryLossFactor F, ratio of the loss to the velocity pressure in the duct
 * @throws RangeError for a negative or endless amount
 */
export function hoodStaticPressure(pressure: Pascals, entryLossFactor: number): Pascals {
  fromZeroUp({ pressure, entryLossFactor });
  return finite((1 + entryLossFactor) * pressure) as Pascals;
}

/**
 * Suction behind a compound hood, a slot before a plenum: SPh = 1.78 pv(slot) + (1 + F) pv(duct), where the duct is the faster.
 * Source: ACGIH Industrial Ventilation, 24th ed. (2001), Fig. 3-16; the condition is from memory.
 * @throws RangeError for a negative or endless amount
 */
export function compoundHoodStaticPressure(slot: Pascals, duct: Pascals, entryLossFactor: number): Pascals {
  fromZeroUp({ slot });
  return finite(1.78 * slot + hoodStaticPressure(duct, entryLossFactor)) as Pascals;
}

/**
 * Coefficient of entry, the share of the airflow that a loss-free hood would take: Ce = √(pv / SPh) = 1 / √(1 + F).
 * Source: ACGIH Industrial Ventilation, 24th ed. (2001), ch. 3.
 * @throws RangeError for a negative or endless factor
 */
export function coefficientOfEntry(entryLossFactor: number): number {
  fromZeroUp({ entryLossFactor });
  return 1 / Math.sqrt(1 + entryLossFactor);
}

/** Ce from a reading: the velocity pressure in the duct against the hood's static pressure, both Pa. */
export function coefficientOfEntryFrom(velocityPressure: Pascals, hoodPressure: Pascals): number {
  fromZeroUp({ velocityPressure });
  aboveZero({ hoodPressure });
  return Math.sqrt(velocityPressure / hoodPressure);
}
