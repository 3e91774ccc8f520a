import fc from 'fast-check';
import { all, create } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { remaining, timeUntil } from '@/lib/air/decay';
import { cubicMetres, cubicMetresPerSecond, seconds } from '@/lib/units/quantity';
import { amount } from './arbitraries';

const math = create(all!, { number: 'BigNumber', precision: 40 });
/** Every digit of a double, which has more of them than the library takes from a bare number. */
const big = (value: number) => math.bignumber(String(value));
const left = (airflow: number, volume: number, time: number, mixing?: number) =>
  remaining(cubicMetresPerSecond(airflow), cubicMetres(volume), seconds(time), mixing);
const until = (share: number, airflow: number, volume: number, mixing?: number) =>
  timeUntil(share, cubicMetresPerSecond(airflow), cubicMetres(volume), mixing);

describe('what is left in a room', () => {
  it('is e^(−Q t / (K V)) held in forty digits', () => {
    fc.assert(
      fc.property(amount(0.01, 5), amount(1, 500), amount(0, 7200), amount(1, 10), (q, v, t, k) => {
        const scope = Object.fromEntries(Object.entries({ q, v, t, k }).map(([name, each]) => [name, big(each)]));
        const exact = Number(math.evaluate('exp(-q * t / (k * v))', scope));
        expect(Math.abs(left(q, v, t, k) - exact)).toBeLessThanOrEqual(1e-13);
      }),
      { numRuns: 300 },
    );
  });

  it('is all of it at first, only ever falls, and falls no faster where it mixes badly', () => {
    fc.assert(
      fc.property(amount(0.01, 5), amount(1, 500), amount(0, 7200), amount(1, 600), amount(1, 10), (q, v, t, dt, k) => {
        expect(left(q, v, 0, k)).toBe(1);
        expect(left(q, v, t + dt, k)).toBeLessThanOrEqual(left(q, v, t, k));
        expect(left(q, v, t, k)).toBeGreaterThanOrEqual(left(q, v, t));
      }),
    );
  });

  it('stays as it is without an airflow', () => expect(left(0, 50, 1e6)).toBe(1));
});

describe('the time until a share is left', () => {
  it('is the time after which that share is left', () => {
    fc.assert(
      fc.property(amount(1e-9, 1), amount(0.01, 5), amount(1, 500), amount(1, 10), (share, q, v, k) => {
        expect(left(q, v, until(share, q, v, k), k) / share).toBeCloseTo(1, 10);
      }),
    );
  });

  it('is a room’s volume over its airflow for 1/e, and twice it for the square', () => {
    expect(until(1 / Math.E, 0.5, 60)).toBeCloseTo(120, 10);
    expect(until(Math.E ** -2, 0.5, 60)).toBeCloseTo(240, 10);
    expect(until(1, 0.5, 60)).toBe(0);
  });

  it('is refused for nothing left, more than all, no airflow and a mixing below 1', () => {
    for (const share of [0, -0.1, 1.1, NaN]) expect(() => until(share, 1, 1)).toThrow(RangeError);
    expect(() => until(0.1, 0, 1)).toThrow(RangeError);
    expect(() => until(0.1, 1, 0)).toThrow(RangeError);
    expect(() => until(0.1, 1, 1, 0.5)).toThrow(/other convention/);
    expect(() => left(1, 1, -1)).toThrow(RangeError);
  });
});
