import { cleanup, render } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { DutyFigure } from '@/components/figures/duty-figure';
import type { FanDutyResult } from '@/lib/worksheets/fan-duty/schema';
import { pointsOf, tableOf, wordsOf } from './drawn';

afterEach(cleanup);

const flows = Array.from({ length: 41 }, (_, i) => i / 200);
const curve = (at: (q: number) => number) => flows.map((airflow) => ({ airflow, staticPressure: at(airflow) }));
/** A fan of 400 − 2000 q Pa, and systems of 20 000 q² and 60 000 q². They meet at q = 0.1, 200 Pa; loaded at (√97 − 1) / 120 = 0.073740. */
const result: FanDutyResult = {
  ...{ airflow: 0.1, staticPressure: 200, crossings: [{ airflow: 0.1, staticPressure: 200 }] },
  curves: { fan: curve((q) => 400 - 2000 * q), system: curve((q) => 20_000 * q * q) },
};
const loaded: FanDutyResult = {
  ...result,
  loadedFilter: { airflow: 0.07374, staticPressure: 252.52 },
  curves: { ...result.curves, loaded: curve((q) => 60_000 * q * q) },
};
const drawn = (given: FanDutyResult, system: 'si' | 'us' = 'si') =>
  render(<DutyFigure {...{ result: given, system }} />).container;
const curvesIn = (container: Element) =>
  [...container.querySelectorAll('path.fill-none')].filter((path) => /C/.test(path.getAttribute('d')!));
const dot = (container: Element) => {
  const circle = container.querySelector('circle.fill-brass')!;
  return { x: Number(circle.getAttribute('cx')), y: Number(circle.getAttribute('cy')) };
};

describe('the duty figure', () => {
  it('says where fan and system meet, and where they do with the filter loaded', () => {
    expect(wordsOf(drawn(result))).toBe('Fan and system meet at 200\u00a0Pa and 360\u00a0m³/h.');
    cleanup();
    expect(wordsOf(drawn(loaded))).toMatch(/With the filter loaded they meet at 265\u00a0m³\/h\.$/);
    cleanup();
    // 0.1 m3/s = 211.9 cfm; 200 Pa = 0.8029 in. w.g.
    expect(wordsOf(drawn(result, 'us'))).toBe('Fan and system meet at 0.803\u00a0in. w.g. and 212\u00a0cfm.');
  });

  it('names every airflow that the fan may stand at where there are several', () => {
    const several = { ...result, crossings: [...result.crossings, { airflow: 0.15, staticPressure: 100 }] };
    const container = drawn(several);
    expect(wordsOf(container)).toContain('They meet again at 540\u00a0m³/h');
    expect(container.querySelectorAll('circle')).toHaveLength(2);
  });

  it('draws the dot where both curves cross', () => {
    const container = drawn(result);
    const [fan, system] = curvesIn(container).map(pointsOf);
    const { x, y } = dot(container);
    for (const points of [fan!, system!]) {
      const nearest = points.reduce((best, each) => (Math.abs(each.x - x) < Math.abs(best.x - x) ? each : best));
      expect(Math.hypot(nearest.x - x, nearest.y - y)).toBeLessThan(0.5);
    }
  });

  it('ends the system’s curve at the top of the drawing and the fan’s at its own end, neither outside', () => {
    const container = drawn(loaded);
    const all = curvesIn(container).map(pointsOf);
    expect(all).toHaveLength(3);
    for (const { x, y } of all.flat()) {
      expect(x).toBeGreaterThanOrEqual(0);
      expect(x).toBeLessThanOrEqual(440);
      expect(y).toBeGreaterThanOrEqual(0);
      expect(y).toBeLessThanOrEqual(310);
    }
    const tops = [all[0]!, all[2]!].map((points) => points.at(-1)!.y);
    expect(tops[0]).toBeCloseTo(tops[1]!, 6);
  });

  it('draws the loaded filter as a dotted line and a ring, and neither without one', () => {
    const ghost = (container: Element) => [
      container.querySelectorAll('path.stroke-quiet[d*="C"]').length,
      container.querySelectorAll('circle.fill-none').length,
    ];
    expect(ghost(drawn(loaded))).toEqual([1, 1]);
    cleanup();
    expect(ghost(drawn(result))).toEqual([0, 0]);
  });

  it('has the same numbers as a table', () => {
    const rows = tableOf(drawn(loaded));
    // Every fourth of 41: at 20 / 200 = 0.1 m3/s the sixth row, 200, 200 and 600 Pa.
    expect(rows).toHaveLength(11);
    expect(rows[5]).toEqual(['360', '200', '200', '600']);
  });

  it('shows a point below nothing where the room blows through a fan', () => {
    const through = {
      ...result,
      airflow: 0.19,
      staticPressure: -60,
      crossings: [{ airflow: 0.19, staticPressure: -60 }],
    };
    expect(dot(drawn(through)).y).toBeLessThan(310 - 46 + 1);
  });
});
