import type { CubicMetresPerSecond, Pascals } from '@/lib/units/quantity';
import type { Fan } from './fan-curve';
import { findRisingRoot, findRoot } from './find-root';

/** Where a fan meets its system. */
export type Crossing = { airflow: CubicMetresPerSecond; staticPressure: Pascals };

/**
 * Every stable meeting of a fan and a system. None: the system asks for more than the fan gives at any airflow. Several: the curve has
 * a hump, and which one the fan settles in is not known. `beyond`: past the last point of the curve. `stall`: left of its peak.
 */
export type Meeting = { crossings: Crossing[]; beyond: boolean; stall: boolean };

const LOOKS = 256;

/**
 * Where the pressure a fan gives equals what a system asks, both in Pa by m3/s. The system must rise with the airflow.
 * The lowest airflow comes first: it is the cautious answer.
 */
export function meetingOf(fan: Fan, systemAt: (airflow: number) => number): Meeting {
  const excess = (q: number) => fan.pressureAt(q) - systemAt(q);
  const at = (q: number): Crossing => ({
    airflow: q as CubicMetresPerSecond,
    staticPressure: systemAt(q) as Pascals,
  });
  const crossings: Crossing[] = [];
  let left = excess(0);
  if (fan.end > 0)
    for (let i = 1; i <= LOOKS; i += 1) {
      const [from, to] = [(fan.end * (i - 1)) / LOOKS, (fan.end * i) / LOOKS];
      const right = excess(to);
      if (left >= 0 && right < 0) crossings.push(at(findRoot(excess, from, to)));
      left = right;
    }
  const beyond = left >= 0 && fan.end > 0;
  if (beyond) crossings.push(at(findRisingRoot((q) => -excess(q), fan.end, Math.max(fan.end, 1e-6))));
  const first = crossings[0];
  return { crossings, beyond: beyond && crossings.length === 1, stall: !!first && first.airflow < fan.peak.airflow };
}

/**
 * The speed, over that of the curve, at which a fan gives an airflow through a system: s with s² p(Q/s) = system(Q).
 * @returns the least such speed up to `most`, or undefined where there is none
 */
export function speedFor(fan: Fan, airflow: number, pressure: number, most = 10): number | undefined {
  const lacking = (s: number) => pressure - s ** 2 * fan.pressureAt(airflow / s);
  const least = Math.max(airflow / (fan.end * 20), 1e-4);
  const ratio = (most / least) ** (1 / LOOKS);
  for (let [i, s] = [0, least]; i < LOOKS; i += 1, s *= ratio) {
    const next = s * ratio;
    if (lacking(s) > 0 && lacking(next) <= 0) return findRoot(lacking, s, next);
  }
  return undefined;
}
