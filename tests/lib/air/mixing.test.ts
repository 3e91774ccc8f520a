import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { effectiveAirflow, fromOneUp, MIXING } from '@/lib/air/mixing';
import { cubicMetresPerSecond } from '@/lib/units/quantity';
import { amount, anyFinite } from './arbitraries';

describe('the mixing factor', () => {
  it('divides the airflow, so that mixing of 1 leaves it whole', () => {
    fc.assert(
      fc.property(amount(0, 50), amount(MIXING.best, MIXING.worst), (airflow, mixing) => {
        const part = effectiveAirflow(cubicMetresPerSecond(airflow), mixing);
        expect(part).toBeLessThanOrEqual(airflow);
        expect(part * mixing).toBeCloseTo(airflow, 12);
      }),
    );
    expect(effectiveAirflow(cubicMetresPerSecond(0.3), 1)).toBe(0.3);
  });

  it('refuses the shares of the other convention, and what is no number', () => {
    for (const bad of [0.2, 0.999, 0, -1, NaN, Infinity]) expect(() => fromOneUp(bad)).toThrow(RangeError);
  });

  it('gives a number or a RangeError for anything', () => {
    fc.assert(
      fc.property(anyFinite, anyFinite, (airflow, mixing) => {
        if (airflow < 0 || mixing < 1)
          expect(() => effectiveAirflow(cubicMetresPerSecond(airflow), mixing)).toThrow(RangeError);
        else expect(effectiveAirflow(cubicMetresPerSecond(airflow), mixing)).toBeGreaterThanOrEqual(0);
      }),
    );
  });
});
