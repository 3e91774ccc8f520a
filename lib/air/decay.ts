import type { CubicMetres, CubicMetresPerSecond, Seconds } from '@/lib/units/quantity';
import { aboveZero, finite, fromZeroUp } from './domain';
import { fromOneUp } from './mixing';

/*
 * A room with no source: the concentration falls as e^(−Q t / (K V)). K is the mixing factor, 1 for perfect mixing.
 * Source: CDC, MMWR 1994;43(RR-13), Table S3-1; ACGIH Industrial Ventilation, 24th ed. (2001), ch. 2.
 */

/**
 * What is left after a time, as a share of what was there.
 * @throws RangeError for a negative or endless amount, no volume, or mixing below 1
 */
export function remaining(airflow: CubicMetresPerSecond, volume: CubicMetres, time: Seconds, mixing = 1): number {
  fromZeroUp({ airflow, time });
  aboveZero({ volume });
  fromOneUp(mixing);
  return Math.exp((-airflow * time) / (mixing * volume));
}

/**
 * Time until a share is left, t = −K (V/Q) ln(share), s.
 * @param share above 0, at most 1
 * @throws RangeError for no airflow, a share that is none, or mixing below 1
 */
export function timeUntil(share: number, airflow: CubicMetresPerSecond, volume: CubicMetres, mixing = 1): Seconds {
  aboveZero({ airflow, volume, share });
  fromOneUp(mixing);
  if (share > 1) throw new RangeError('share must be at most 1');
  return finite((mixing * volume * -Math.log(share)) / airflow || 0) as Seconds;
}
