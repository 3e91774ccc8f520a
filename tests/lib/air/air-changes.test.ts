import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { airChanges, airflowOfChanges } from '@/lib/air/air-changes';
import { cubicMetres, cubicMetresPerSecond } from '@/lib/units/quantity';
import { amount } from './arbitraries';

describe('air changes', () => {
  it('are volumes of the room an hour: 50 m3/h in 25 m3 is 2', () => {
    expect(airChanges(cubicMetresPerSecond(50 / 3600), cubicMetres(25))).toBeCloseTo(2, 12);
  });

  it('turn into the airflow that makes them, and back', () => {
    fc.assert(
      fc.property(amount(0, 100), amount(0.1, 1e4), (changes, volume) => {
        const airflow = airflowOfChanges(changes, cubicMetres(volume));
        expect(airChanges(airflow, cubicMetres(volume))).toBeCloseTo(changes, 10);
      }),
    );
  });

  it('are refused of no room', () => {
    expect(() => airChanges(cubicMetresPerSecond(1), cubicMetres(0))).toThrow(RangeError);
    expect(() => airChanges(cubicMetresPerSecond(-1), cubicMetres(1))).toThrow(RangeError);
    expect(() => airflowOfChanges(NaN, cubicMetres(1))).toThrow(RangeError);
  });
});
