import type { CubicMetresPerSecond, Pascals } from '@/lib/units/quantity';
import type { Air } from './air-density';
import { airflowThrough } from './airflow-through';
import type { DuctSystem } from './duct-system';
import { withoutHump, type Fan } from './fan-curve';
import { findRisingRoot } from './find-root';
import { systemPressure } from './system-pressure';

/** Something that takes air out of a room. `airflowAt` its pressure against outdoors, Pa: it never falls as that rises. */
export type Exhaust = {
  name: string;
  wanted: CubicMetresPerSecond;
  airflowAt: (roomPressure: number) => number;
  /** The most that it could hold a room below outdoors, Pa. */
  reach: Pascals;
};

/**
 * What a small fan of unknown curve is taken to pull at most, Pa: up to nine tenths of it the stated airflow, then falling to none.
 * Common practice, no source: it only stops such a fan from emptying a room that lets nothing in.
 */
export const UNKNOWN_REACH = 250 as Pascals;

/** An exhaust of which only the airflow is known: it is held as far as its reach allows. */
export const statedExhaust = (name: string, airflow: CubicMetresPerSecond): Exhaust => ({
  ...{ name, wanted: airflow, reach: UNKNOWN_REACH },
  airflowAt: (pressure) => airflow * Math.min(1, Math.max(0, (UNKNOWN_REACH + pressure) / (0.1 * UNKNOWN_REACH))),
});

/**
 * A fan on its hood and duct: it must also lift what the room is below outdoors. Where the room pulls harder than the fan can, air
 * comes back in through it, and the airflow is negative.
 */
export function fanExhaust(name: string, fan: Fan, system: DuctSystem, air: Air, loaded = false): Exhaust {
  const cautious = withoutHump(fan);
  const lossAt = systemPressure(system, air, loaded);
  const shutOff = cautious.pressureAt(0);
  const airflowAt = (pressure: number) => {
    const over = shutOff + pressure;
    if (over <= 0) return airflowThrough(lossAt, over);
    return findRisingRoot((q) => lossAt(q) - cautious.pressureAt(q) - pressure, 0, fan.end / 2 || 0.02);
  };
  const wanted = airflowAt(0) as CubicMetresPerSecond;
  return { name, wanted, airflowAt, reach: Math.max(fan.peak.pressure, shutOff) as Pascals };
}
