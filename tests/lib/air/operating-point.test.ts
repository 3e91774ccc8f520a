import { curveMonotoneX, line } from 'd3-shape';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fanOf, inParallel, inSeries, withoutHump, type FanCurve } from '@/lib/air/fan-curve';
import { findRoot } from '@/lib/air/find-root';
import { meetingOf, speedFor } from '@/lib/air/operating-point';
import { steffen, type Point } from '@/lib/air/steffen';
import { cubicMetresPerSecond, pascals } from '@/lib/units/quantity';

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true, noDefaultInfinity: true });
const curveOf = (points: [number, number][]): FanCurve =>
  points.map(([q, p]) => ({ airflow: cubicMetresPerSecond(q), staticPressure: pascals(p) }));
/** Any curve that falls from left to right. */
const curves = fc.array(fc.tuple(real(0.01, 1), real(1, 300)), { minLength: 2, maxLength: 12 }).map((steps) => {
  let [q, p] = [0, steps.reduce((sum, [, fall]) => sum + fall, 0)];
  return curveOf([[0, p], ...steps.map(([more, fall]): [number, number] => [(q += more), (p -= fall)])]);
});
/** A made-up fan: its points are those of a published check of a whole shop, in m3/s and Pa. */
const SMALL = curveOf([
  [0, 340],
  [200 / 3600, 300],
  [480 / 3600, 200],
  [700 / 3600, 100],
  [900 / 3600, 0],
]);
const system = (k: number) => (q: number) => k * q * Math.abs(q);

describe('the curve through the points', () => {
  it('is the one the plot draws', () => {
    const points: Point[] = [
      [0, 340],
      [0.05, 300],
      [0.13, 200],
      [0.19, 100],
      [0.25, 0],
    ];
    const drawn = line<Point>()
      .x(([x]) => x)
      .y(([, y]) => y)
      .curve(curveMonotoneX)
      .digits(15)(points as Point[])!;
    const [, first, rest] = /^M([^C]+)C(.+)$/.exec(drawn)!;
    const numbers = `${first},${rest}`.split(/[C,]/).map(Number);
    const bezier = (from: number, t: number, axis: 0 | 1) => {
      const [a, b, c, d] = [0, 1, 2, 3].map((i) => numbers[from * 6 + 2 * i + axis]!) as [
        number,
        number,
        number,
        number,
      ];
      return (1 - t) ** 3 * a + 3 * (1 - t) ** 2 * t * b + 3 * (1 - t) * t ** 2 * c + t ** 3 * d;
    };
    const ours = steffen(points);
    for (const segment of [0, 1, 2, 3]) expect(ours(bezier(segment, 0.4, 0))).toBeCloseTo(bezier(segment, 0.4, 1), 9);
  });

  it('passes through every point and never beyond its neighbours', () => {
    fc.assert(
      fc.property(
        fc.array(fc.tuple(real(0.001, 1), real(-100, 100)), { minLength: 2, maxLength: 30 }),
        real(0, 1),
        (steps, share) => {
          let x = 0;
          const points = steps.map(([dx, y]): Point => [(x += dx), y]);
          const at = steffen(points);
          points.forEach(([px, py]) => expect(at(px)).toBeCloseTo(py, 9));
          points.slice(1).forEach(([x1, y1], i) => {
            const [x0, y0] = points[i]!;
            const y = at(x0 + share * (x1 - x0));
            expect(y).toBeGreaterThanOrEqual(Math.min(y0, y1) - 1e-9);
            expect(y).toBeLessThanOrEqual(Math.max(y0, y1) + 1e-9);
          });
        },
      ),
    );
  });

  it('refuses points that do not go to the right', () => {
    expect(() => steffen([[0, 1]])).toThrow(RangeError);
    expect(() =>
      steffen([
        [0, 1],
        [0, 2],
      ]),
    ).toThrow(RangeError);
  });
});

describe('a fan on its system', () => {
  it('meets it where both give the same pressure, to 1e-9', () => {
    fc.assert(
      fc.property(curves, real(1, 1e5), (curve, k) => {
        const fan = fanOf(curve);
        const { crossings } = meetingOf(fan, system(k));
        expect(crossings).toHaveLength(1);
        const { airflow, staticPressure } = crossings[0]!;
        expect(Math.abs(fan.pressureAt(airflow) - system(k)(airflow))).toBeLessThanOrEqual(
          1e-9 * Math.max(1, fan.peak.pressure),
        );
        expect(staticPressure).toBe(system(k)(airflow));
      }),
    );
  });

  it('moves no more air through a harder system, and no less at a higher speed', () => {
    fc.assert(
      fc.property(curves, real(1, 1e4), real(1, 10), real(0.2, 1), (curve, k, times, speed) => {
        const flow = (hardness: number, s = 1) => meetingOf(fanOf(curve, s), system(hardness)).crossings[0]!.airflow;
        expect(flow(k * times)).toBeLessThanOrEqual(flow(k) * (1 + 1e-9));
        expect(flow(k, speed)).toBeLessThanOrEqual(flow(k) * (1 + 1e-9));
      }),
    );
  });

  it('says so where it never meets, where the curve ends first, and where it meets twice', () => {
    expect(meetingOf(fanOf(SMALL), (q) => 400 + q).crossings).toEqual([]);
    expect(meetingOf(fanOf(SMALL.slice(0, 3)), system(10))).toMatchObject({ beyond: true, stall: false });
    const hump = fanOf(
      curveOf([
        [0, 300],
        [0.1, 150],
        [0.2, 260],
        [0.3, 0],
      ]),
    );
    const flat = meetingOf(hump, (q) => 200 + q);
    expect(flat.crossings).toHaveLength(2);
    expect(flat.crossings[0]!.airflow).toBeLessThan(0.1);
    expect(withoutHump(hump).pressureAt(0.2)).toBeCloseTo(150, 6);
    expect(withoutHump(fanOf(SMALL)).pressureAt(0.1)).toBe(fanOf(SMALL).pressureAt(0.1));
  });

  it('stands left of its peak where it stalls', () => {
    const fan = fanOf(
      curveOf([
        [0, 200],
        [0.1, 250],
        [0.2, 0],
      ]),
    );
    expect(meetingOf(fan, system(1e6)).stall).toBe(true);
    expect(meetingOf(fan, system(1e3)).stall).toBe(false);
  });

  it('needs the speed that then gives the airflow', () => {
    fc.assert(
      fc.property(real(0.01, 0.2), real(100, 1e5), (airflow, k) => {
        const speed = speedFor(fanOf(SMALL), airflow, system(k)(airflow));
        if (speed === undefined) return;
        expect(meetingOf(fanOf(SMALL, speed), system(k)).crossings[0]!.airflow).toBeCloseTo(airflow, 8);
      }),
    );
  });

  it('adds pressures one behind the other and airflows side by side', () => {
    const fan = fanOf(SMALL);
    expect(inSeries([fan, fan]).pressureAt(0.1)).toBeCloseTo(2 * fan.pressureAt(0.1), 12);
    expect(inParallel(fan, 2).pressureAt(0.2)).toBeCloseTo(fan.pressureAt(0.1), 12);
    const alone = meetingOf(fan, system(5000)).crossings[0]!.airflow;
    const both = meetingOf(inParallel(fan, 2), system(5000)).crossings[0]!.airflow;
    expect(both).toBeGreaterThan(alone);
    expect(both).toBeLessThan(2 * alone);
  });
});

describe('a bracketed root', () => {
  it('is found to the last digits', () => {
    fc.assert(
      fc.property(real(-50, 50), (at) => {
        expect(findRoot((x) => (x - at) ** 3 + (x - at), -60, 60)).toBeCloseTo(at, 10);
      }),
    );
    expect(findRoot(Math.cos, 1, 2)).toBeCloseTo(Math.PI / 2, 15);
  });

  it('is refused where the signs are alike', () => expect(() => findRoot((x) => x * x + 1, -1, 1)).toThrow(RangeError));
});
