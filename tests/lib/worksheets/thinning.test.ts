import { describe, expect, it } from 'vitest';
import { clearingTimeRequest } from '@/lib/worksheets/clearing-time/schema';
import { solveClearingTime } from '@/lib/worksheets/clearing-time/solve';
import { dilutionRequest } from '@/lib/worksheets/dilution/schema';
import { solveDilution } from '@/lib/worksheets/dilution/solve';

const thin = (question: object) => solveDilution(dilutionRequest.parse(question)).result.airflow;
const clear = (question: object) => solveClearingTime(clearingTimeRequest.parse(question)).result;
const spray = { volume: 52, airflow: 1000 / 3600 };

describe('the dilution worksheet', () => {
  it('is K G / C by mass, and the same through ppm', () => {
    expect(thin({ generation: { massRate: 6 }, limit: { value: 30, unit: 'mg/m3' }, mixingFactor: 4 })).toBeCloseTo(
      0.8,
      12,
    );
    const ppm = (30 * 24.45) / 92.14;
    expect(
      thin({ generation: { massRate: 6 }, limit: { value: ppm, unit: 'ppm' }, molarMass: 92.14, mixingFactor: 4 }),
    ).toBeCloseTo(0.8, 9);
  });

  it('is the evaporation equation of the trade, 403 pints and all', () => {
    // ACGIH’s own worked figures from memory, checked in another place: 1.5 pints an hour of methyl chloroform, K 5, 350 ppm: 1424 cfm.
    const pint = 0.473176473;
    const airflow = thin({
      generation: { liquidRate: 1.5 * pint, specificGravity: 1.32, molarMass: 133.4 },
      limit: { value: 350, unit: 'ppm' },
      mixingFactor: 5,
    });
    expect(airflow / 4.719474e-4).toBeCloseTo(1424, 0);
  });

  it.each([
    ['a mass and a liquid', { generation: { massRate: 1, liquidRate: 1 } }, ['generation', 'liquidRate']],
    ['half a liquid', { generation: { liquidRate: 1 } }, ['generation', 'specificGravity']],
    ['a mixing factor of the other convention', { mixingFactor: 0.2 }, ['mixingFactor']],
    ['a mass against ppm without a molar mass', { limit: { value: 1, unit: 'ppm' } }, ['molarMass']],
  ])('refuses %s', (_, more, path) =>
    expect(
      dilutionRequest.safeParse({
        generation: { massRate: 1 },
        limit: { value: 1, unit: 'mg/m3' },
        mixingFactor: 3,
        ...more,
      }).error?.issues[0]?.path,
    ).toEqual(path),
  );
});

describe('the clearing worksheet', () => {
  // A spray room of 5 × 4 × 2.6 m and 1000 m3/h: 19.2 air changes; to 1 % 14 minutes mixed perfectly, 43 with a factor of 3.
  it('meets a hand sum for a spray room', () => {
    expect(clear({ ...spray, removal: 0.99 }).airChanges).toBeCloseTo(19.2, 1);
    expect(Math.round(clear({ ...spray, removal: 0.99 }).time / 60)).toBe(14);
    expect(Math.round(clear({ ...spray, removal: 0.99, mixingFactor: 3 }).time / 60)).toBe(43);
  });

  it('is the same from a share, from two concentrations, and after a source', () => {
    const time = clear({ ...spray, removal: 0.9 }).time;
    expect(clear({ ...spray, from: 50, to: 5 }).time).toBeCloseTo(time, 9);
    const source = clear({ ...spray, massRate: 2, duration: 1e6, to: 0.72 });
    // After so long the room holds G / Q = 2 / 0.2778 = 7.2 mg/m3, a tenth of which is 0.72.
    expect(source.peak).toBeCloseTo(7.2, 6);
    expect(source.time).toBeCloseTo(time, 6);
  });

  it('draws a curve that falls from all to what is left, the badly mixed one above the perfect one', () => {
    const { curve, curvePerfect, time } = clear({ ...spray, removal: 0.99, mixingFactor: 3 });
    expect(curve[0]!.fraction).toBe(1);
    expect(curve.every(({ fraction }, i) => i === 0 || fraction < curve[i - 1]!.fraction)).toBe(true);
    expect(curve.every(({ fraction }, i) => fraction >= curvePerfect[i]!.fraction)).toBe(true);
    expect(curve.at(-1)!.time).toBeGreaterThan(time);
  });

  it.each([
    ['nothing to reach', {}, ['removal']],
    ['two ways at once', { removal: 0.9, from: 5, to: 1 }, ['removal']],
    ['a start without an end', { from: 5 }, ['to']],
    ['an end above the start', { from: 1, to: 5 }, ['to']],
    ['a source without its time', { massRate: 5 }, ['duration']],
    ['all of it', { removal: 1 }, ['removal']],
  ])('refuses %s', (_, more, path) =>
    expect(clearingTimeRequest.safeParse({ ...spray, ...more }).error?.issues[0]?.path).toEqual(path),
  );
});
