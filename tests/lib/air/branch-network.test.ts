import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ROOM_AIR } from '@/lib/air/air-density';
import { balancingLosses, branchLossAt, solveNetwork, type Branch } from '@/lib/air/branch-network';
import type { DuctRun, DuctSystem } from '@/lib/air/duct-system';
import { fanOf } from '@/lib/air/fan-curve';
import { meetingOf } from '@/lib/air/operating-point';
import { systemLoss } from '@/lib/air/duct-system';
import { cubicMetresPerSecond, metres, pascals } from '@/lib/units/quantity';

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true, noDefaultInfinity: true });
const fan = (speed = 1) =>
  fanOf(
    [
      [0, 900],
      [0.1, 800],
      [0.25, 500],
      [0.4, 0],
    ].map(([q, p]) => ({ airflow: cubicMetresPerSecond(q!), staticPressure: pascals(p!) })),
    speed,
  );
const run = (diameter: number, length: number): DuctRun => ({
  duct: 'galvanised-steel',
  diameter: metres(diameter),
  length: metres(length),
});
const system = (entryLossFactor: number, ...runs: DuctRun[]): DuctSystem => ({ entryLossFactor, runs });
const branch = (name: string, diameter: number, length: number, open = true, more: Partial<Branch> = {}): Branch => ({
  ...{ name, open, system: system(0.5, run(diameter, length)) },
  ...more,
});
const main = system(0, run(0.15, 4));
const solve = (branches: Branch[], speed = 1) => solveNetwork({ branches, main, fan: fan(speed), air: ROOM_AIR });

describe('machines on one fan', () => {
  it('take each what its duct lets through at one suction, and together what the fan gives', () => {
    fc.assert(
      fc.property(
        fc.array(fc.record({ d: real(0.05, 0.2), l: real(0.5, 20), open: fc.boolean() }), {
          minLength: 1,
          maxLength: 6,
        }),
        (given) => {
          const branches = given.map(({ d, l, open }, i) => branch(`${i}`, d, l, open));
          const answer = solve(branches);
          const peak = fan().peak.pressure;
          expect(Math.abs(answer.residual)).toBeLessThanOrEqual(1e-9 * peak);
          answer.branches.forEach(({ airflow }, i) =>
            expect(branchLossAt(branches[i]!, ROOM_AIR)(airflow)).toBeCloseTo(answer.junction, 6),
          );
          expect(answer.branches.reduce((sum, { airflow }) => sum + airflow, 0)).toBeCloseTo(answer.airflow, 12);
        },
      ),
      { numRuns: 150 },
    );
  });

  it('is one duct where there is one machine', () => {
    const alone = solve([branch('laser', 0.15, 3)]).airflow;
    const series = system(0.5, run(0.15, 3), run(0.15, 4));
    const { crossings } = meetingOf(fan(), (q) => systemLoss(series, cubicMetresPerSecond(q), ROOM_AIR).staticPressure);
    expect(alone).toBeCloseTo(crossings[0]!.airflow, 9);
  });

  it('gives the longer of two alike branches less, and shutting one gives the other more', () => {
    const both = solve([branch('near', 0.1, 1), branch('far', 0.1, 15)]).branches;
    expect(both[1]!.airflow).toBeLessThan(both[0]!.airflow);
    const one = solve([branch('near', 0.1, 1, false), branch('far', 0.1, 15)]).branches;
    expect(one[1]!.airflow).toBeGreaterThan(both[1]!.airflow);
    expect(one[0]!.airflow).toBeGreaterThan(0);
    expect(one[0]!.airflow).toBeLessThan(0.1 * both[0]!.airflow);
  });

  it('sends air back out of an idle hood only where its room is drawn down harder than the duct', () => {
    const open = solve([branch('here', 0.1, 2), branch('there', 0.1, 2)]).branches;
    expect(open.every(({ airflow }) => airflow > 0)).toBe(true);
    const off = solve(
      [branch('here', 0.1, 2, true, { roomPressure: pascals(-8) }), branch('there', 0.1, 2)],
      0,
    ).branches;
    expect(off[0]!.airflow).toBeLessThan(0);
    expect(off[1]!.airflow).toBeGreaterThan(0);
  });

  it('is balanced by the losses that a gate must add', () => {
    const wanted = cubicMetresPerSecond(0.06);
    const branches = [branch('near', 0.1, 1, true, { wanted }), branch('far', 0.1, 15, true, { wanted })];
    const [near, far] = balancingLosses(branches, ROOM_AIR);
    expect(far).toMatchObject({ k: 0, rules: true });
    const gated = branch('near', 0.1, 1, true, {
      system: system(0.5, { ...run(0.1, 1), fittings: [{ fitting: 'gate', count: 1, k: near!.k }] }),
    });
    const [lossNear, lossFar] = [gated, branches[1]!].map((each) => branchLossAt(each, ROOM_AIR)(wanted));
    expect(lossNear).toBeCloseTo(lossFar!, 9);
  });
});
