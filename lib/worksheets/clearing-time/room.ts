import { concentrationAfter } from '@/lib/air/build-up';
import { clearingAirflow } from '@/lib/air/cleaner';
import { remaining } from '@/lib/air/decay';
import {
  cubicMetres,
  cubicMetresPerSecond,
  milligramsPerSecond,
  seconds,
  type CubicMetres,
  type CubicMetresPerSecond,
  type MilligramsPerCubicMetre,
} from '@/lib/units/quantity';
import type { ClearingTimeQuestion, ClearingTimeResult } from './schema';

const POINTS = 60;

/** The room as it clears: `airflow` is all that clears it, a filter's part with it. */
export type Room = { airflow: CubicMetresPerSecond; volume: CubicMetres; mixing: number };
type Curve = ClearingTimeResult['curve'];

/** The room of a question; mixed perfectly where no factor is given. */
export function roomOf({ airflow, cleanAir = 0, volume, mixingFactor = 1 }: ClearingTimeQuestion): Room {
  const size = cubicMetres(volume);
  const all = clearingAirflow(cubicMetresPerSecond(airflow), cubicMetresPerSecond(cleanAir), size);
  return { airflow: all, volume: size, mixing: mixingFactor };
}

/** What is left by time, as shares of what was there, over a time in s. */
export const decayOf = ({ airflow, volume, mixing }: Room, end: number): Curve =>
  Array.from({ length: POINTS + 1 }, (_, i) => {
    const time = seconds((end * i) / POINTS);
    return { time, fraction: remaining(airflow, volume, time, mixing) };
  });

/** The concentration, mg/m3, that a source of mg/s has made after a time in s, with the same mixing all the while. */
export const concentrationOf = (room: Room, massRate: number, time: number): MilligramsPerCubicMetre =>
  concentrationAfter({ generation: milligramsPerSecond(massRate), ...room }, seconds(time));

/**
 * How it rose while the source ran, as shares of what it came to, its end being the time 0. The shares do not hang on the release.
 * @param duration s that the source ran
 * @param shown s before its end from which it is told
 */
export function buildUpOf(room: Room, duration: number, shown: number): Curve {
  const back = Math.min(duration, shown);
  const peak = concentrationOf(room, 1, duration);
  return Array.from({ length: POINTS + 1 }, (_, i) => {
    const before = back * (1 - i / POINTS);
    return { time: 0 - before, fraction: concentrationOf(room, 1, duration - before) / peak };
  });
}
