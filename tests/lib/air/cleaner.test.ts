import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { steadyConcentration } from '@/lib/air/build-up';
import { cleanAir, clearingAirflow, equivalentAirChanges } from '@/lib/air/cleaner';
import { cubicMetres, cubicMetresPerSecond, milligramsPerSecond } from '@/lib/units/quantity';
import { amount } from './arbitraries';

const all = (ventilation: number, clean: number, volume: number, settling?: number) =>
  clearingAirflow(cubicMetresPerSecond(ventilation), cubicMetresPerSecond(clean), cubicMetres(volume), settling);

describe('a cleaner', () => {
  it('gives its airflow times what it holds back: half of 0.2 m3/s is 0.1', () => {
    expect(cleanAir(cubicMetresPerSecond(0.2), 0.5)).toBe(0.1);
    expect(() => cleanAir(cubicMetresPerSecond(0.2), -0.1)).toThrow(RangeError);
  });

  it('stands for air changes: 0.1 m3/s in 36 m3 are 10 an hour', () => {
    expect(equivalentAirChanges(cubicMetresPerSecond(0.1), cubicMetres(36))).toBeCloseTo(10, 12);
  });

  it('adds to the ventilation and to what settles: S / (Q + CADR + k V)', () => {
    // By hand: 0.05 + 0.1 + 0.001 × 50 = 0.2 m3/s; 3 mg/s into it come to 15 mg/m3.
    const airflow = all(0.05, 0.1, 50, 0.001);
    expect(airflow).toBeCloseTo(0.2, 12);
    expect(steadyConcentration({ generation: milligramsPerSecond(3), airflow })).toBeCloseTo(15, 10);
  });

  it('never makes a room worse', () => {
    fc.assert(
      fc.property(amount(0, 5), amount(0, 5), amount(0.1, 500), amount(0, 0.01), (q, clean, volume, settling) => {
        expect(all(q, clean, volume, settling)).toBeGreaterThanOrEqual(all(q, 0, volume));
      }),
    );
  });

  it('is refused where it has no answer', () => {
    expect(() => all(-1, 0, 1)).toThrow(RangeError);
    expect(() => all(0, NaN, 1)).toThrow(RangeError);
    expect(() => all(0, 0, 1, Infinity)).toThrow(RangeError);
  });
});
