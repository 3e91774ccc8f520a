import type {
  CubicMetres,
  CubicMetresPerSecond,
  MilligramsPerCubicMetre,
  MilligramsPerSecond,
  Seconds,
} from '@/lib/units/quantity';
import { aboveZero, finite, fromZeroUp } from './domain';
import { fromOneUp } from './mixing';

/** A source in a room: release mg/s, airflow m3/s of clean air, volume m3, and the mixing factor. */
export type Source = {
  generation: MilligramsPerSecond;
  airflow: CubicMetresPerSecond;
  volume: CubicMetres;
  mixing?: number;
};

/**
 * What it comes to in the end: C = G K / Q, mg/m3. Source: mass balance; ACGIH Industrial Ventilation, 24th ed. (2001), ch. 2.
 * @throws RangeError for a negative or endless amount, no airflow, or mixing below 1
 */
export function steadyConcentration({
  generation,
  airflow,
  mixing = 1,
}: Omit<Source, 'volume'>): MilligramsPerCubicMetre {
  fromZeroUp({ generation });
  aboveZero({ airflow });
  fromOneUp(mixing);
  return finite((generation * mixing) / airflow) as MilligramsPerCubicMetre;
}

/**
 * Concentration after a time with the source going: C = (G/Q')(1 − e^(−Q' t/V)) + C₀ e^(−Q' t/V), Q' = Q/K; with no airflow
 * C₀ + G t / V. Source: ACGIH Industrial Ventilation, 24th ed. (2001), ch. 2.
 * @throws RangeError for a negative or endless amount, no volume, or mixing below 1
 */
export function concentrationAfter(
  { generation, airflow, volume, mixing = 1 }: Source,
  time: Seconds,
  start = 0 as MilligramsPerCubicMetre,
): MilligramsPerCubicMetre {
  fromZeroUp({ generation, airflow, time, start });
  aboveZero({ volume });
  fromOneUp(mixing);
  const decay = (airflow * time) / (mixing * volume);
  const grown = decay < 1e-12 ? (generation * time) / volume : (generation * mixing * -Math.expm1(-decay)) / airflow;
  return finite(grown + start * Math.exp(-decay)) as MilligramsPerCubicMetre;
}
