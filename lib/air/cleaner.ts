import type {
  CubicMetres,
  CubicMetresPerSecond,
  MilligramsPerCubicMetre,
  MilligramsPerSecond,
} from '@/lib/units/quantity';
import { airChanges } from './air-changes';
import { aboveZero, finite, fromZeroUp } from './domain';

/**
 * Clean air that a filter gives: its airflow times the share it holds back, m3/s. It counts for particles, or for gases, never both.
 * Source: its definition (AHAM AC-1), CADR = η Q.
 * @throws RangeError for a negative or endless amount, or an efficiency above 1
 */
export function cleanAir(airflow: CubicMetresPerSecond, efficiency: number): CubicMetresPerSecond {
  fromZeroUp({ airflow, efficiency });
  if (efficiency > 1) throw new RangeError('efficiency must be at most 1');
  return (airflow * efficiency) as CubicMetresPerSecond;
}

/** Air changes an hour that a cleaner stands for: 3600 CADR / V. */
export const equivalentAirChanges = (clean: CubicMetresPerSecond, volume: CubicMetres) => airChanges(clean, volume);

/**
 * Concentration that a room with ventilation, a cleaner and settling comes to: C = G / (Q + CADR + k V), mg/m3.
 * Source: mass balance; no published worked value was found.
 * @param settling share of the room's air that settles clean, 1/s
 */
export function concentrationWithCleaner(
  generation: MilligramsPerSecond,
  ventilation: CubicMetresPerSecond,
  clean: CubicMetresPerSecond,
  volume: CubicMetres,
  settling = 0,
): MilligramsPerCubicMetre {
  fromZeroUp({ generation, ventilation, clean, volume, settling });
  const removed = ventilation + clean + settling * volume;
  aboveZero({ removed });
  return finite(generation / removed) as MilligramsPerCubicMetre;
}

/** Vapour a bed of carbon holds when full: w m, in the unit of the mass. Source: carbon capacity as share of weight. */
export function carbonHolds(mass: number, capacity: number): number {
  fromZeroUp({ mass, capacity });
  return finite(mass * capacity);
}

/** How much of the theoretical life is used in practice. Source: a laboratory-hood maker's article, about one third. */
export const PRACTICAL_SHARE = 1 / 3;
