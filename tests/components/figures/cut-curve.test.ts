import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { cutCurve } from '@/components/figures/cut-curve';

const points = (...pressures: number[]) => pressures.map((staticPressure, airflow) => ({ airflow, staticPressure }));

describe('a curve that is cut off at the edges of a drawing', () => {
  it('stays as it is inside them', () => expect(cutCurve(points(0, 5, 9), 0, 10)).toEqual(points(0, 5, 9)));

  it('ends on the edge, where the straight line between its points passes it', () => {
    expect(cutCurve(points(0, 4, 20), 0, 12)).toEqual([...points(0, 4), { airflow: 1.5, staticPressure: 12 }]);
    expect(cutCurve(points(8, -8), 0, 12)).toEqual([...points(8), { airflow: 0.5, staticPressure: 0 }]);
  });

  it('begins on the edge where it comes from outside, and passes through both in order', () => {
    expect(cutCurve(points(-10, 30), 0, 20).map(({ airflow }) => airflow)).toEqual([0.25, 0.75]);
    expect(cutCurve(points(30, -10), 0, 20).map(({ airflow }) => airflow)).toEqual([0.25, 0.75]);
  });

  it('never leaves the edges and never turns back', () => {
    const pressure = fc.double({ min: -1e4, max: 1e4, noNaN: true });
    fc.assert(
      fc.property(fc.array(pressure, { maxLength: 40 }), (pressures) => {
        const cut = cutCurve(points(...pressures), 0, 500);
        cut.forEach(({ airflow, staticPressure }, i) => {
          expect(staticPressure).toBeGreaterThanOrEqual(0);
          expect(staticPressure).toBeLessThanOrEqual(500);
          expect(airflow).toBeGreaterThanOrEqual(cut[i - 1]?.airflow ?? 0);
        });
      }),
    );
  });
});
