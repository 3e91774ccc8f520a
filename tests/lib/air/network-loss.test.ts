import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ROOM_AIR } from '@/lib/air/air-density';
import { solveNetwork, type Branch } from '@/lib/air/branch-network';
import type { DuctRun, DuctSystem } from '@/lib/air/duct-system';
import { systemLoss } from '@/lib/air/duct-system';
import { fanOf } from '@/lib/air/fan-curve';
import { networkLossAt } from '@/lib/air/network-loss';
import { cubicMetresPerSecond, metres, pascals } from '@/lib/units/quantity';

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true, noDefaultInfinity: true });
const run = (diameter: number, length: number): DuctRun => ({
  ...{ duct: 'smooth-plastic', diameter: metres(diameter), length: metres(length) },
});
const system = (entryLossFactor: number, ...runs: DuctRun[]): DuctSystem => ({ entryLossFactor, runs });
const branch = (diameter: number, length: number, more: Partial<Branch> = {}): Branch => ({
  ...{ name: `${diameter}`, open: true, system: system(0.5, run(diameter, length)) },
  ...more,
});
const main = system(0, run(0.2, 4));
const asks = (...branches: Branch[]) => networkLossAt({ branches, main, air: ROOM_AIR });
const lossOf = (duct: DuctSystem, q: number) => systemLoss(duct, cubicMetresPerSecond(q), ROOM_AIR).staticPressure;

describe('what machines on one fan ask of it together', () => {
  it('is one duct after the other where there is one machine', () => {
    for (const q of [0.01, 0.1, 0.25])
      expect(asks(branch(0.2, 3))(q)).toBeCloseTo(lossOf(system(0.5, run(0.2, 3), run(0.2, 4)), q), 6);
  });

  it('of two alike machines is that of one at half the airflow, then the common duct', () => {
    const common = (q: number) => lossOf(main, q) - lossOf(system(0, run(0.2, 0)), q);
    for (const q of [0.02, 0.15, 0.3])
      expect(asks(branch(0.12, 5), branch(0.12, 5))(q)).toBeCloseTo(
        lossOf(system(0.5, run(0.12, 5)), q / 2) + common(q),
        6,
      );
  });

  it('meets the fan where the network does, and rises with the airflow', () => {
    const fan = fanOf(
      [0, 0.1, 0.25, 0.4].map((q, i) => ({
        ...{ airflow: cubicMetresPerSecond(q), staticPressure: pascals([900, 800, 500, 0][i]!) },
      })),
    );
    const machine = fc.record({ d: real(0.005, 1), l: real(0, 100), open: fc.boolean(), room: real(-50, 50) });
    fc.assert(
      fc.property(fc.array(machine, { minLength: 1, maxLength: 8 }), (given) => {
        const branches = given.map(({ d, l, open, room }) => branch(d, l, { open, roomPressure: pascals(room) }));
        const loss = asks(...branches);
        const { airflow, staticPressure } = solveNetwork({ branches, main, fan, air: ROOM_AIR });
        if (airflow > 1e-6) expect(loss(airflow) / staticPressure).toBeCloseTo(1, 6);
        const all = [0, 0.01, 0.1, 1, 10].map(loss);
        all.forEach((each, i) => expect(each).toBeGreaterThan(all[i - 1] ?? -Infinity));
      }),
      { numRuns: 60 },
    );
  });

  it('is reckoned where a shut gate has next to nothing to drive it', () => {
    const hair = branch(0.005, 5e-324, { open: false, roomPressure: pascals(-5.3e-311) });
    expect(asks(hair, branch(0.005, 0, { open: false }))(0)).toBeCloseTo(0, 9);
  });
});
