import type { CubicMetresPerSecond, Pascals } from '@/lib/units/quantity';
import { steffen, steffenSlopes, type Point } from './steffen';

/** What a maker prints of a fan: static pressure by airflow, 2 to 30 points, airflow rising strictly. */
export type FanCurve = readonly { airflow: CubicMetresPerSecond; staticPressure: Pascals }[];
export const MAX_POINTS = 30;

/** A fan as the solver sees it: the pressure at an airflow, and the airflow where its curve is known to end. */
export type Fan = { pressureAt: (airflow: number) => number; end: number; peak: { airflow: number; pressure: number } };

const pointsOf = (curve: FanCurve): Point[] => curve.map(({ airflow, staticPressure }) => [airflow, staticPressure]);

/**
 * The fan of a curve: Steffen's curve through its points; before the first the first pressure; beyond the last a straight line with the
 * last slope, never upward, so that a fan blown through by its room still has an answer.
 * @param speed measured speed over the speed of the curve
 * @param density density of the air over that of the curve
 * @throws RangeError for a curve that is none
 */
export function fanOf(curve: FanCurve, speed = 1, density = 1): Fan {
  const points = pointsOf(curve).map(([q, p]): Point => [q * speed, p * speed ** 2 * density]);
  if (speed === 0) return { pressureAt: () => 0, end: 0, peak: { airflow: 0, pressure: 0 } };
  const inside = steffen(points);
  const [end, last] = points.at(-1)!;
  const slope = Math.min(0, steffenSlopes(points).at(-1)!);
  const peak = points.reduce((best, point) => (point[1] > best[1] ? point : best));
  return {
    pressureAt: (q) => (q > end ? last + slope * (q - end) : inside(q)),
    end,
    peak: { airflow: peak[0], pressure: peak[1] },
  };
}

/** Two or more fans one behind the other: at the same airflow their pressures add. */
export const inSeries = (fans: readonly Fan[]): Fan => ({
  pressureAt: (q) => fans.reduce((sum, fan) => sum + fan.pressureAt(q), 0),
  end: Math.min(...fans.map(({ end }) => end)),
  peak: fans.reduce((most, { peak }) => (peak.airflow > most.airflow ? peak : most), { airflow: 0, pressure: 0 }),
});

/** Alike fans side by side: each takes its share of the airflow at the same pressure. */
export const inParallel = (fan: Fan, count: number): Fan => ({
  pressureAt: (q) => fan.pressureAt(q / count),
  end: fan.end * count,
  peak: { ...fan.peak, airflow: fan.peak.airflow * count },
});

/**
 * The same fan without its hump: at each airflow the least pressure it gives at or below it. A curve that falls then rises again has
 * more than one answer; this is the cautious one, and it is the one a room is solved with, since it is continuous.
 */
export function withoutHump(fan: Fan): Fan {
  const steps = 240;
  const grid = Array.from({ length: steps + 1 }, (_, i) => (fan.end * i) / steps);
  let least = Infinity;
  const lows = grid.map((q) => (least = Math.min(least, fan.pressureAt(q))));
  if (lows.every((low, i) => low >= fan.pressureAt(grid[i]!) - 1e-12)) return fan;
  const low = fan.end > 0 ? steffen(grid.map((q, i): Point => [q, lows[i]!])) : () => 0;
  return { ...fan, pressureAt: (q) => (q > fan.end ? Math.min(lows.at(-1)!, fan.pressureAt(q)) : low(q)) };
}
