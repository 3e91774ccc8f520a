import type { CubicMetres, CubicMetresPerSecond } from '@/lib/units/quantity';
import { aboveZero, finite, fromZeroUp } from './domain';

/**
 * Air changes an hour: n = 3600 Q / V. Source: its definition, as CDC, MMWR 1994;43(RR-13).
 * @throws RangeError for a negative or endless amount, or no volume
 */
export function airChanges(airflow: CubicMetresPerSecond, volume: CubicMetres): number {
  fromZeroUp({ airflow });
  aboveZero({ volume });
  return finite((3600 * airflow) / volume);
}

/** The airflow of some air changes an hour: Q = n V / 3600, m3/s. */
export function airflowOfChanges(changes: number, volume: CubicMetres): CubicMetresPerSecond {
  fromZeroUp({ changes, volume });
  return finite((changes * volume) / 3600) as CubicMetresPerSecond;
}
