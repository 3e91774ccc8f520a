import type { CubicMetres, CubicMetresPerSecond } from '@/lib/units/quantity';
import { airChanges } from './air-changes';
import { finite, fromZeroUp } from './domain';

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

/** Air changes an hour that a cleaner stands for: 3600 CADR / V. Source: CDC, MMWR 1994;43(RR-13). @throws as `airChanges` */
export const equivalentAirChanges = (clean: CubicMetresPerSecond, volume: CubicMetres) => airChanges(clean, volume);

/**
 * All that clears a room, as one airflow: Q + CADR + k V, m3/s. What stands side by side adds up (CDC, MMWR 1994;43(RR-13)). Build-up,
 * decay and the steady concentration take it for their airflow. Source: mass balance; no published worked value was found.
 * @param settling what falls out or decays by itself, as a share of the room's air, 1/s
 * @throws RangeError for a negative or endless amount
 */
export function clearingAirflow(
  ventilation: CubicMetresPerSecond,
  clean: CubicMetresPerSecond,
  volume: CubicMetres,
  settling = 0,
): CubicMetresPerSecond {
  fromZeroUp({ ventilation, clean, volume, settling });
  return finite(ventilation + clean + settling * volume) as CubicMetresPerSecond;
}
