import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dilutionAirflow } from '@/lib/air/dilution';
import { milligramsPerCubicMetre, milligramsPerSecond } from '@/lib/units/quantity';
import { amount } from './arbitraries';

const airflow = (generation: number, concentration: number, mixing?: number) =>
  dilutionAirflow(milligramsPerSecond(generation), milligramsPerCubicMetre(concentration), mixing);

describe('the air that thins a release', () => {
  it('is the release over the concentration, times the mixing factor: 5 mg/s to 10 mg/m3 at 3 is 1.5 m3/s by hand', () => {
    expect(airflow(5, 10)).toBe(0.5);
    expect(airflow(5, 10, 3)).toBe(1.5);
    expect(airflow(0, 10, 3)).toBe(0);
  });

  it('carries away just what is released, at the concentration to hold, whatever the mixing', () => {
    fc.assert(
      fc.property(amount(1e-3, 1e3), amount(1e-3, 1e3), amount(1, 10), (generation, concentration, mixing) => {
        const carried = (airflow(generation, concentration, mixing) / mixing) * concentration;
        expect(carried / generation).toBeCloseTo(1, 12);
      }),
    );
  });

  it('is refused where it has no answer', () => {
    for (const bad of [-1, NaN, Infinity]) {
      expect(() => airflow(bad, 1)).toThrow(RangeError);
      expect(() => airflow(1, bad)).toThrow(RangeError);
      expect(() => airflow(1, 1, bad)).toThrow(RangeError);
    }
    expect(() => airflow(1, 0)).toThrow(RangeError);
    expect(() => airflow(1, 1, 0.2)).toThrow(/other convention/);
    expect(() => airflow(1e300, 1e-300)).toThrow(RangeError);
  });
});
