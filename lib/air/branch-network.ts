import type { CubicMetresPerSecond, MetresPerSecond, Pascals } from '@/lib/units/quantity';
import { airflowThrough, eitherWay } from './airflow-through';
import type { Air } from './air-density';
import { areaOfDuct, systemLoss, type DuctSystem } from './duct-system';
import { withoutHump, type Fan } from './fan-curve';
import { findRoot } from './find-root';
import { systemPressure } from './system-pressure';
import { velocityPressure } from './velocity-pressure';

/** What a shut gate lets through, as a share of the duct's area: common practice, no source. */
export const GATE_LEAK = 0.02;
/** Discharge coefficient of the crack round a gate. Source: ASHRAE Fundamentals (2021), sharp openings 0.6 to 0.65. */
const CRACK = 0.6;

/**
 * One machine's hood and duct up to the common one. `roomPressure` in Pa against outdoors, 0 unless told. `leak` of a shut gate.
 * `wanted` in m3/s.
 */
export type Branch = {
  name: string;
  system: DuctSystem;
  open: boolean;
  leak?: number;
  roomPressure?: Pascals;
  wanted?: CubicMetresPerSecond;
};

/** Machines on one fan: their branches, and the common duct and outlet behind where they meet (without a hood of its own). */
export type Network = { branches: readonly Branch[]; main: DuctSystem; fan: Fan; air: Air };

/** Negative airflow comes out of the hood into the room. */
export type BranchAnswer = {
  name: string;
  open: boolean;
  airflow: CubicMetresPerSecond;
  velocity: MetresPerSecond;
  wanted?: CubicMetresPerSecond;
};

/** `junction` is the suction where the branches meet, Pa below outdoors; `residual` what the fan's pressure is off by, Pa. */
export type NetworkAnswer = {
  airflow: CubicMetresPerSecond;
  staticPressure: Pascals;
  junction: Pascals;
  residual: number;
  branches: BranchAnswer[];
};

/** What a branch loses at an airflow; a shut gate is a crack that its air goes through. */
export function branchLossAt({ system, open, leak = GATE_LEAK }: Branch, air: Air): (airflow: number) => number {
  const duct = systemPressure(system, air);
  if (open) return duct;
  const crack = CRACK * leak * areaOfDuct(system.runs[0]!.diameter);
  return (q) => duct(q) + velocityPressure((q / crack) as MetresPerSecond, air.density);
}

/** What the common duct loses: its air already moves, so of its "hood" only what is lost counts, and not the velocity pressure. */
export const mainLossAt = (main: DuctSystem, air: Air) => {
  const duct = systemPressure(main, air);
  const first = areaOfDuct(main.runs[0]!.diameter);
  return (q: number) => duct(q) - velocityPressure((q / first) as MetresPerSecond, air.density);
};

/**
 * How the air of one fan divides among its branches: at the one suction where they meet, each takes what its duct lets through, and
 * together they are what the fan gives there. One bracketed solve over that suction; the fan without its hump, so there is one answer.
 * Source: ACGIH Industrial Ventilation, 24th ed. (2001), ch. 5 (balance at a junction by static pressure).
 */
export function solveNetwork({ branches, main, fan, air }: Network): NetworkAnswer {
  const cautious = withoutHump(fan);
  const losses = branches.map((branch) => branchLossAt(branch, air));
  const mainLoss = eitherWay(mainLossAt(main, air));
  const flows = (suction: number) =>
    losses.map((loss, i) => airflowThrough(loss, suction + (branches[i]!.roomPressure ?? 0)));
  const total = (all: number[]) => all.reduce((sum, q) => sum + q, 0);
  const excess = (suction: number) => {
    const q = total(flows(suction));
    return cautious.pressureAt(Math.max(0, q)) - suction - mainLoss(q);
  };
  const rooms = branches.reduce((most, { roomPressure = 0 }) => Math.max(most, Math.abs(roomPressure)), 0);
  const junction = findRoot(
    excess,
    -rooms - 1e-9,
    Math.max(0, cautious.pressureAt(0), fan.peak.pressure) + rooms + 1e-9,
  );
  const each = flows(junction);
  const airflow = total(each);
  return {
    airflow: airflow as CubicMetresPerSecond,
    staticPressure: (junction + mainLoss(airflow)) as Pascals,
    junction: junction as Pascals,
    residual: excess(junction),
    branches: branches.map(({ name, open, system, wanted }, i) => ({
      ...{ name, open, wanted, airflow: each[i] as CubicMetresPerSecond },
      velocity: (each[i]! / areaOfDuct(system.runs[0]!.diameter)) as MetresPerSecond,
    })),
  };
}

/**
 * The loss factor that a gate must add to each open branch so that all draw what they want: the branch that asks for the most suction
 * rules and gets none. Branches without a wanted airflow are left out.
 */
export function balancingLosses(branches: readonly Branch[], air: Air): { name: string; k: number; rules: boolean }[] {
  const asked = branches.flatMap(({ name, system, open, wanted }) =>
    open && wanted ? [{ name, loss: systemLoss(system, wanted, air) }] : [],
  );
  const most = Math.max(...asked.map(({ loss }) => loss.staticPressure));
  return asked.map(({ name, loss }) => ({
    name,
    k: (most - loss.staticPressure) / loss.runs.at(-1)!.velocityPressure,
    rules: loss.staticPressure === most,
  }));
}
