import type { Air } from '@/lib/air/air-density';
import { compressionOf, type DuctSystem, type RunLoss, type SystemLoss } from '@/lib/air/duct-system';
import { DUCT_KINDS } from '@/lib/air/duct-kind';
import { fittingOf } from '@/lib/air/fitting';
import { compressionFactor } from '@/lib/air/flexible-compression';
import type { CubicMetresPerSecond } from '@/lib/units/quantity';
import { ACGIH, ASHRAE_DUCT, CONTINUITY, n, step } from './steps';
import type { Step } from './worksheet';

type Run = DuctSystem['runs'][number];

function frictionStep(run: Run, loss: RunLoss, title: string): Step {
  const kind = DUCT_KINDS[run.duct];
  const roughness = run.roughness ?? kind.roughness;
  const slack = compressionOf(run);
  const penalty =
    slack > 0 ? ` × ${n(compressionFactor(run.diameter, slack))} (pushed together by ${n(100 * slack)} %)` : '';
  const f = `f = ${n(loss.frictionFactor)} at Re = ${n(loss.reynolds)}, ε = ${n(1000 * roughness)} mm`;
  return step(
    `${title}: friction`,
    `Δp = f (L/D) pv${penalty && ' × penalty'} = ${n(loss.frictionFactor)} × (${n(run.length)} / ${n(run.diameter)}) × ${n(loss.velocityPressure)}${penalty}; ${f}`,
    loss.friction,
    'Pa',
    `Darcy and Colebrook, ${ASHRAE_DUCT}, eq. 18 to 23; ${kind.source}`,
  );
}

function fittingsStep(run: Run, loss: RunLoss, title: string): Step[] {
  const fittings = run.fittings ?? [];
  if (fittings.length === 0) return [];
  const sum = fittings.map(({ fitting, count, k }) => `${count} × ${n(k ?? fittingOf(fitting)!.k!)}`).join(' + ');
  const sources = [
    ...new Set(fittings.map(({ fitting, k }) => (k === undefined ? fittingOf(fitting)!.source : 'C as given'))),
  ];
  return [
    step(
      `${title}: fittings`,
      `Δp = ΣC pv = (${sum}) × ${n(loss.velocityPressure)}`,
      loss.fittings,
      'Pa',
      sources.join('; '),
    ),
  ];
}

function runSteps(run: Run, loss: RunLoss, i: number, flow: number, air: Air): Step[] {
  const title = `Run ${i + 1}`;
  return [
    step(
      `${title}: velocity`,
      `V = 4 Q / (π D²) = 4 × ${n(flow)} / (π × ${n(run.diameter)}²)`,
      loss.velocity,
      'm/s',
      CONTINUITY,
    ),
    step(
      `${title}: velocity pressure`,
      `pv = ρ V² / 2 = ${n(air.density)} × ${n(loss.velocity)}² / 2`,
      loss.velocityPressure,
      'Pa',
      `${ACGIH}, ch. 1`,
    ),
    frictionStep(run, loss, title),
    ...fittingsStep(run, loss, title),
  ];
}

/** The working of a duct at an airflow, run by run, then the sum. */
export function ductSteps(system: DuctSystem, loss: SystemLoss, flow: CubicMetresPerSecond, air: Air): Step[] {
  const { filter, outlet } = system;
  const lines = system.runs.flatMap((run, i) => runSteps(run, loss.runs[i]!, i, flow, air));
  const last = loss.runs.at(-1)!.velocityPressure;
  return [
    ...lines,
    step(
      'Suction behind the hood',
      `SPh = (1 + F) pv = (1 + ${n(system.entryLossFactor)}) × ${n(loss.runs[0]!.velocityPressure)}`,
      loss.hoodStaticPressure,
      'Pa',
      `${ACGIH}, ch. 3`,
    ),
    ...(filter
      ? [
          step(
            'Filter, clean',
            `Δp = Δp₀ Q / Q₀ = ${n(filter.clean)} × ${n(flow)} / ${n(filter.at)}`,
            loss.filter,
            'Pa',
            'As given; in proportion to the airflow, as a mat’s loss is (from memory)',
          ),
        ]
      : []),
    ...(outlet ? [step('Outlet', `Δp = C pv = ${n(outlet.k)} × ${n(last)}`, loss.outlet, 'Pa', 'C as given')] : []),
    step(
      'Rise of static pressure that the fan must give',
      'hood + friction + fittings + filter + outlet',
      loss.staticPressure,
      'Pa',
      `${ACGIH}, ch. 5`,
    ),
    step(
      'The same as catalogues define fan static pressure',
      `FSP = SP outlet − SP inlet − pv = ${n(loss.staticPressure)} − ${n(last)}`,
      loss.fanStaticPressure,
      'Pa',
      `${ACGIH}, ch. 6`,
    ),
  ];
}
