import fc from 'fast-check';
import { all, create } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { concentrationAfter, steadyConcentration } from '@/lib/air/build-up';
import {
  cubicMetres,
  cubicMetresPerSecond,
  milligramsPerCubicMetre,
  milligramsPerSecond,
  seconds,
} from '@/lib/units/quantity';
import { amount } from './arbitraries';

const math = create(all!, { number: 'BigNumber', precision: 40 });
const source = (generation: number, airflow: number, volume: number, mixing = 1) => ({
  generation: milligramsPerSecond(generation),
  airflow: cubicMetresPerSecond(airflow),
  volume: cubicMetres(volume),
  mixing,
});
const after = (of: ReturnType<typeof source>, time: number, start = 0) =>
  concentrationAfter(of, seconds(time), milligramsPerCubicMetre(start));
const sources = fc.tuple(amount(0.01, 100), amount(0.01, 5), amount(1, 500), amount(1, 10)).map((of) => source(...of));

/** The balance V dC/dt = G − Q C / K itself, in steps of the classical fourth-order Runge–Kutta kind. */
function stepped({ generation, airflow, volume, mixing }: ReturnType<typeof source>, time: number, start: number) {
  const steps = 2000;
  const dt = time / steps;
  const slope = (c: number) => (generation - (airflow * c) / mixing) / volume;
  let c = start;
  for (let i = 0; i < steps; i += 1) {
    const a = slope(c);
    const b = slope(c + (dt * a) / 2);
    const d = slope(c + (dt * b) / 2);
    c += (dt * (a + 2 * b + 2 * d + slope(c + dt * d))) / 6;
  }
  return c;
}

describe('the concentration while a source runs', () => {
  it('is what the balance of mass itself comes to, step by step', () => {
    fc.assert(
      fc.property(sources, amount(0.01, 10), amount(0, 100), (of, changes, start) => {
        // At most 10 changes in 2000 steps: each is short enough for the steps to be good to ten figures.
        const time = (changes * of.mixing * of.volume) / of.airflow;
        expect(after(of, time, start) / stepped(of, time, start)).toBeCloseTo(1, 9);
      }),
      { numRuns: 100 },
    );
  });

  it('never passes the higher of the start and what it comes to in the end', () => {
    fc.assert(
      fc.property(sources, amount(0, 1e6), amount(0, 1e4), (of, time, start) => {
        const most = Math.max(start, steadyConcentration(of));
        expect(after(of, time, start)).toBeLessThanOrEqual(most * (1 + 1e-12));
        expect(after(of, time)).toBeLessThanOrEqual(steadyConcentration(of) * (1 + 1e-12));
      }),
    );
  });

  it('only rises from clean air', () => {
    fc.assert(
      fc.property(sources, amount(0, 1e4), amount(0.1, 1e3), (of, time, more) => {
        expect(after(of, time + more)).toBeGreaterThanOrEqual(after(of, time) * (1 - 1e-12));
      }),
    );
  });

  it('keeps its digits where little air has been changed', () => {
    const [g, q, v, t] = [3, 1e-5, 1e5, 10] as const;
    const scope = Object.fromEntries(
      Object.entries({ g, q, v, t }).map(([name, value]) => [name, math.bignumber(value)]),
    );
    const exact = Number(math.evaluate('g / q * (1 - exp(-q * t / v))', scope));
    expect(after(source(g, q, v), t) / exact).toBeCloseTo(1, 12);
  });

  it('is all that was released, in a room without an airflow', () => {
    expect(after(source(2, 0, 50), 100, 1)).toBe(5);
  });

  it('comes to K G / Q: 2 mg/s into 0.5 m3/s mixed by 3 is 12 mg/m3', () => {
    expect(steadyConcentration(source(2, 0.5, 50, 3))).toBe(12);
    expect(after(source(2, 0.5, 50, 3), 1e5)).toBeCloseTo(12, 12);
  });

  it('is refused where it has no answer', () => {
    expect(() => steadyConcentration(source(1, 0, 1))).toThrow(RangeError);
    expect(() => steadyConcentration(source(1, 1, 1, 0.2))).toThrow(/other convention/);
    expect(() => after(source(1, 1, 0), 1)).toThrow(RangeError);
    expect(() => after(source(-1, 1, 1), 1)).toThrow(RangeError);
    expect(() => after(source(1, 1, 1), NaN)).toThrow(RangeError);
    expect(() => after(source(1, 1, 1, 0.2), 1)).toThrow(/other convention/);
  });
});
