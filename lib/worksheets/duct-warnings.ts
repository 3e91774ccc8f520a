import { compressionOf, type DuctSystem, type RunLoss, type SystemLoss } from '@/lib/air/duct-system';
import { DUCT_KINDS } from '@/lib/air/duct-kind';
import { fittingOf, isFromMemory } from '@/lib/air/fitting';
import { TESTED_COMPRESSION, TESTED_FROM, TESTED_TO } from '@/lib/air/flexible-compression';
import { LAMINAR_BELOW, TURBULENT_ABOVE } from '@/lib/air/friction-factor';
import { TRANSPORT, type Carried } from '@/lib/air/transport-velocity';
import { told, toldBoth } from '@/lib/units/show';
import type { Warning } from './worksheet';

/** Above it a duct in a small shop is loud, m/s: common practice, no source. */
export const LOUD = 20;
/** The most flexible hose that is advised, m. Source: ASHRAE Fundamentals (2021), ch. 21. */
export const LONGEST_HOSE = 2;

type Run = DuctSystem['runs'][number];
const when = (holds: boolean, code: string, text: string): Warning[] => (holds ? [{ code, text }] : []);
const numbers = (runs: readonly Run[], holds: (run: Run, i: number) => boolean) =>
  runs.flatMap((run, i) => (holds(run, i) ? [i + 1] : [])).join(', ');

function ofHose(runs: readonly Run[]): Warning[] {
  const slack = numbers(runs, (run) => compressionOf(run) > 0);
  const untested = numbers(
    runs,
    (run) =>
      compressionOf(run) > 0 &&
      (run.diameter < TESTED_FROM || run.diameter > TESTED_TO || compressionOf(run) > TESTED_COMPRESSION),
  );
  const hose = runs.reduce((sum, run) => sum + (DUCT_KINDS[run.duct].flexible ? run.length : 0), 0);
  return [
    ...when(
      slack !== '',
      'slack-hose',
      `Run ${slack} is a hose that is not pulled straight. Pulled straight, or made of pipe, it loses a fraction of that: do it before buying a fan.`,
    ),
    ...when(
      untested !== '',
      'beyond-tests',
      `The penalty for slack in run ${untested} is an extrapolation: hoses of 150 to 250 mm pushed together by up to 30 % were tested.`,
    ),
    ...when(
      hose > LONGEST_HOSE,
      'long-hose',
      `There are ${toldBoth('length', hose)} of hose. At most ${toldBoth('length', LONGEST_HOSE)}, fully stretched, are advised (ASHRAE); lay the rest in pipe.`,
    ),
  ];
}

function ofFlow(runs: readonly RunLoss[]): Warning[] {
  const laminar = runs.flatMap(({ reynolds }, i) => (reynolds < LAMINAR_BELOW ? [i + 1] : []));
  const between = runs.flatMap(({ reynolds }, i) =>
    reynolds >= LAMINAR_BELOW && reynolds < TURBULENT_ABOVE ? [i + 1] : [],
  );
  const loud = runs.flatMap(({ velocity }, i) => (velocity > LOUD ? [i + 1] : []));
  return [
    ...when(
      laminar.length > 0,
      'laminar',
      `In run ${laminar.join(', ')} the flow is laminar: hardly any air moves there.`,
    ),
    ...when(
      between.length > 0,
      'transition',
      `In run ${between.join(', ')} the flow is between laminar and turbulent, where no equation holds: the loss is a straight line between the two.`,
    ),
    ...when(
      loud.length > 0,
      'loud',
      `In run ${loud.join(', ')} the air goes faster than ${toldBoth('velocity', LOUD)}: loud, and dear in pressure (common practice, no source). A wider duct costs far less.`,
    ),
  ];
}

function ofTransport(runs: readonly RunLoss[], carries?: Carried): Warning[] {
  if (!carries) return [];
  const { name, standards } = TRANSPORT[carries];
  const slowest = Math.min(...runs.map(({ velocity }) => velocity));
  return standards
    .filter(({ least }) => slowest < least)
    .map(({ least, source }) => ({
      code: 'settles',
      text: `At ${told('velocity', slowest, 'si')} in its slowest run, ${name} may settle: ${source} asks for ${toldBoth('velocity', least)}. What settles narrows the duct, and can burn.`,
    }));
}

/** All there is to say of a duct before its number is used. */
export function ductWarnings(system: DuctSystem, loss: Pick<SystemLoss, 'runs'>, carries?: Carried): Warning[] {
  const codes = system.runs.flatMap(({ fittings = [] }) =>
    fittings.filter(({ k }) => k === undefined).map(({ fitting }) => fitting),
  );
  const memory = [...new Set(codes)].flatMap((code) => fittingOf(code) ?? []).filter(isFromMemory);
  return [
    ...ofTransport(loss.runs, carries),
    ...ofHose(system.runs),
    ...ofFlow(loss.runs),
    ...when(
      memory.length > 0,
      'from-memory',
      `The loss factor of ${memory.map(({ name }) => name).join(', ')} is from memory: check it.`,
    ),
    ...when(
      !system.filter,
      'no-filter',
      'No filter is counted. One in the way, and the machine’s own passages, ask for pressure of their own.',
    ),
  ];
}
