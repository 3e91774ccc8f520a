import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ROOM_AIR } from '@/lib/air/air-density';
import { lossFactorOf, runLoss, systemLoss, type DuctRun, type DuctSystem } from '@/lib/air/duct-system';
import { DUCTS } from '@/lib/air/duct-kind';
import { FITTINGS, fittingOf } from '@/lib/air/fitting';
import { compressionFactor } from '@/lib/air/flexible-compression';
import { systemPressure } from '@/lib/air/system-pressure';
import { cubicMetresPerSecond, metres, pascals } from '@/lib/units/quantity';

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true, noDefaultInfinity: true });
const runs = fc.record({
  duct: fc.constantFrom(...DUCTS),
  diameter: real(0.02, 1.5).map(metres),
  length: real(0, 100).map(metres),
  compression: real(0, 0.9),
  fittings: fc.array(
    fc.record({
      fitting: fc.constantFrom(...FITTINGS.filter(({ k }) => k).map(({ code }) => code)),
      count: fc.integer({ min: 1, max: 12 }),
    }),
    { maxLength: 4 },
  ),
});
const systems: fc.Arbitrary<DuctSystem> = fc.record({
  entryLossFactor: real(0, 3),
  runs: fc.array(runs, { minLength: 1, maxLength: 6 }),
  outlet: fc.option(
    real(0, 3).map((k) => ({ k })),
    { nil: undefined },
  ),
  filter: fc.option(
    real(0, 500).map((clean) => ({ clean: pascals(clean), at: cubicMetresPerSecond(0.2) })),
    { nil: undefined },
  ),
});
const at = (q: number) => cubicMetresPerSecond(q);

describe('a duct system', () => {
  it('asks for more the more air it moves, from nothing at none, and never for no number', () => {
    fc.assert(
      fc.property(systems, real(1e-6, 5), real(1.001, 3), (system, q, times) => {
        const [less, more] = [q, q * times].map((each) => systemLoss(system, at(each), ROOM_AIR));
        expect(more!.staticPressure).toBeGreaterThan(less!.staticPressure);
        expect(Number.isFinite(more!.staticPressure)).toBe(true);
        expect(systemLoss(system, at(0), ROOM_AIR).staticPressure).toBe(0);
      }),
      { numRuns: 1500 },
    );
  });

  it('asks the same of a solver as in its parts, to the last digits', () => {
    fc.assert(
      fc.property(systems, real(1e-6, 3), fc.boolean(), (system, q, loaded) => {
        const { staticPressure } = systemLoss(system, at(q), ROOM_AIR, loaded);
        expect(Math.abs(systemPressure(system, ROOM_AIR, loaded)(q) - staticPressure)).toBeLessThanOrEqual(
          1e-11 * staticPressure,
        );
      }),
      { numRuns: 500 },
    );
  });

  it('is the sum of its parts', () => {
    fc.assert(
      fc.property(systems, real(0.001, 2), (system, q) => {
        const loss = systemLoss(system, at(q), ROOM_AIR);
        const ducts = loss.runs.reduce((sum, run) => sum + run.friction + run.fittings, 0);
        const sum = loss.hoodStaticPressure + ducts + loss.filter + loss.outlet;
        expect(loss.staticPressure / sum).toBeCloseTo(1, 9);
        const last = loss.runs.at(-1)!.velocityPressure;
        expect(Math.abs(loss.fanStaticPressure + last - sum)).toBeLessThanOrEqual(1e-12 * (sum + last));
      }),
      { numRuns: 500 },
    );
  });

  it('loses in two runs of one size what one run of both lengths does', () => {
    const run = (length: number): DuctRun => ({
      duct: 'galvanised-steel',
      diameter: metres(0.125),
      length: metres(length),
    });
    const both = systemLoss({ entryLossFactor: 0.5, runs: [run(3), run(5)] }, at(0.12), ROOM_AIR);
    const one = systemLoss({ entryLossFactor: 0.5, runs: [run(8)] }, at(0.12), ROOM_AIR);
    expect(both.staticPressure).toBeCloseTo(one.staticPressure, 9);
  });

  it('loses more in a slack hose than in a stretched one, and in that more than in steel', () => {
    const friction = (duct: DuctRun['duct']) =>
      runLoss({ duct, diameter: metres(0.15), length: metres(3) }, at(0.12), ROOM_AIR).friction;
    expect(friction('flexible-slack')).toBeGreaterThan(friction('flexible-stretched'));
    expect(friction('flexible-stretched')).toBeGreaterThan(friction('galvanised-steel'));
    expect(friction('flexible-slack') / friction('flexible-stretched')).toBeCloseTo(
      compressionFactor(metres(0.15), 0.15),
      9,
    );
  });

  it('takes a told loss factor before the tabled one, and refuses where neither is', () => {
    expect(lossFactorOf({ fitting: 'mitre-90', count: 2 })).toBe(2.4);
    expect(lossFactorOf({ fitting: 'mitre-90', count: 2, k: 1 })).toBe(2);
    expect(() => lossFactorOf({ fitting: 'wall-cap', count: 1 })).toThrow(RangeError);
    expect(fittingOf('no-such')).toBeUndefined();
  });

  it('refuses a system without a duct', () =>
    expect(() => systemLoss({ entryLossFactor: 0.5, runs: [] }, at(0.1), ROOM_AIR)).toThrow(RangeError));
});
