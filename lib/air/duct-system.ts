import type { CubicMetresPerSecond, Metres, MetresPerSecond, Pascals } from '@/lib/units/quantity';
import type { Air } from './air-density';
import { aboveZero, finite, fromZeroUp } from './domain';
import { DUCT_KINDS, type DuctKind } from './duct-kind';
import { fittingOf } from './fitting';
import { compressionFactor } from './flexible-compression';
import { frictionFactor } from './friction-factor';
import { hoodStaticPressure } from './hood-static-pressure';
import { reynoldsNumber } from './reynolds';
import { velocityPressure } from './velocity-pressure';

/** Some fittings of one kind. `k` stands in for the tabled loss factor, and must be given where there is none. */
export type RunFitting = { fitting: string; count: number; k?: number };

/** A length of duct of one diameter. `compression` is how far a flexible hose is pushed together, 0 to below 1. */
export type DuctRun = {
  duct: DuctKind;
  diameter: Metres;
  length: Metres;
  compression?: number;
  roughness?: Metres;
  fittings?: readonly RunFitting[];
};

/** A filter's loss at one airflow, clean and loaded; it is taken as proportional to the airflow, as a mat's is. */
export type Filter = { clean: Pascals; loaded?: Pascals; at: CubicMetresPerSecond };

/** A hood, its duct and its outlet, in series on one fan. */
export type DuctSystem = {
  entryLossFactor: number;
  runs: readonly DuctRun[];
  outlet?: { k: number };
  filter?: Filter;
};

/** What one run does at an airflow. `friction` and `fittings` in Pa. */
export type RunLoss = {
  velocity: MetresPerSecond;
  velocityPressure: Pascals;
  reynolds: number;
  frictionFactor: number;
  friction: Pascals;
  fittings: Pascals;
};

/**
 * `staticPressure` is the rise of static pressure from the fan's inlet to its outlet: hood, friction, fittings, filter, outlet.
 * `fanStaticPressure` is the same less the velocity pressure at the inlet, as catalogues define it.
 */
export type SystemLoss = {
  staticPressure: Pascals;
  fanStaticPressure: Pascals;
  hoodStaticPressure: Pascals;
  filter: Pascals;
  outlet: Pascals;
  runs: RunLoss[];
};

export const areaOfDuct = (diameter: Metres) => (Math.PI * diameter ** 2) / 4;

/** The loss factor of some fittings of one kind, all together. @throws RangeError where none is known and none was given */
export function lossFactorOf({ fitting, count, k = fittingOf(fitting)?.k }: RunFitting): number {
  if (k === undefined) throw new RangeError(`${fitting} has no published loss factor: give k`);
  return count * k;
}

/** How far a run's hose is pushed together: as told, or as its kind usually is. */
export const compressionOf = ({ duct, compression }: DuctRun) =>
  DUCT_KINDS[duct].flexible ? (compression ?? DUCT_KINDS[duct].slack) : 0;

/**
 * What a run loses at an airflow: friction by Darcy, Δp = f (L/D) pv, times the penalty of a slack hose, and ΣC pv of its fittings.
 * Source: ASHRAE Fundamentals (2021), ch. 21, eq. 18 to 23 and 29.
 * @throws RangeError for a negative or endless amount, or a fitting of unknown loss
 */
export function runLoss(run: DuctRun, airflow: CubicMetresPerSecond, air: Air): RunLoss {
  aboveZero({ diameter: run.diameter });
  fromZeroUp({ airflow, length: run.length });
  const velocity = (airflow / areaOfDuct(run.diameter)) as MetresPerSecond;
  const pressure = velocityPressure(velocity, air.density);
  const reynolds = reynoldsNumber(velocity, run.diameter, air);
  const roughness = run.roughness ?? DUCT_KINDS[run.duct].roughness;
  const factor = reynolds > 0 ? frictionFactor(reynolds, roughness / run.diameter) : 0;
  const penalty = compressionFactor(run.diameter, compressionOf(run));
  const lost = (run.fittings ?? []).reduce((sum, each) => sum + lossFactorOf(each), 0);
  return {
    ...{ velocity, velocityPressure: pressure, reynolds, frictionFactor: factor },
    friction: finite(factor * (run.length / run.diameter) * pressure * penalty) as Pascals,
    fittings: finite(lost * pressure) as Pascals,
  };
}

/** What a filter loses at an airflow, Pa: clean, or loaded where that is asked and known. */
export const filterLoss = (filter: Filter, airflow: CubicMetresPerSecond, loaded = false) =>
  finite(((loaded ? (filter.loaded ?? filter.clean) : filter.clean) * airflow) / filter.at) as Pascals;

/**
 * What a hood, its duct and its outlet ask of a fan at an airflow. It rises with the airflow, from 0 at 0.
 * Source: ACGIH Industrial Ventilation, 24th ed. (2001), ch. 5; ASHRAE Fundamentals (2021), ch. 21.
 * @throws RangeError for a negative or endless amount, no run, or a fitting of unknown loss
 */
export function systemLoss(system: DuctSystem, airflow: CubicMetresPerSecond, air: Air, loaded = false): SystemLoss {
  const runs = system.runs.map((run) => runLoss(run, airflow, air));
  const first = runs[0]?.velocityPressure;
  const last = runs.at(-1)?.velocityPressure;
  if (first === undefined || last === undefined) throw new RangeError('a system has at least one run of duct');
  const hood = hoodStaticPressure(first, system.entryLossFactor);
  const filter = system.filter ? filterLoss(system.filter, airflow, loaded) : (0 as Pascals);
  const outlet = finite((system.outlet?.k ?? 0) * last) as Pascals;
  const ducts = runs.reduce((sum, run) => sum + run.friction + run.fittings, 0);
  const staticPressure = finite(hood + ducts + filter + outlet) as Pascals;
  const fanStaticPressure = (staticPressure - last) as Pascals;
  return { staticPressure, fanStaticPressure, hoodStaticPressure: hood, filter, outlet, runs };
}
