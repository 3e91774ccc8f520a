import { TYPED_UNITS, type System } from '@/lib/units/kinds';
import { askedWorksheet } from '@/lib/worksheets/ask/asked-worksheet';
import { cell } from '@/lib/worksheets/cells';
import type { Cell } from '@/lib/worksheets/worksheet';
import { ductPressureAsk } from './ask';
import { ductPressureAnswer, ductPressureRequest, type DuctPressureResult } from './schema';
import { solveDuctPressure } from './solve';

/** The runs as rows for a spreadsheet. */
function rows(
  { runs, hoodStaticPressure, filter, outlet, staticPressure }: DuctPressureResult,
  system: System,
): Cell[][] {
  const [speed, loss] = [TYPED_UNITS.velocity[system], TYPED_UNITS.pressure[system]];
  const pressure = (value: number) => cell('pressure', value, system);
  return [
    ['Part', `Velocity (${speed})`, 'Reynolds number', 'Friction factor', `Friction (${loss})`, `Fittings (${loss})`],
    ['Hood', '', '', '', '', pressure(hoodStaticPressure)],
    ...runs.map((run, i): Cell[] => [
      ...[`Run ${i + 1}`, cell('velocity', run.velocity, system), Math.round(run.reynolds)],
      ...[Number(run.frictionFactor.toPrecision(5)), pressure(run.friction), pressure(run.fittings)],
    ]),
    ['Filter', '', '', '', '', pressure(filter)],
    ['Outlet', '', '', '', '', pressure(outlet)],
    ['All', '', '', '', '', pressure(staticPressure)],
  ];
}

/** The duct worksheet. */
export const ductPressure = askedWorksheet({
  about: {
    title: 'How much pressure does a duct cost?',
    question:
      'I want this much air through this pipe, with these bends. How much pressure must the fan give, and how fast does it go?',
    summary:
      'From airflow, hood, runs, bends, filter and outlet to the static pressure a fan must give, with the velocity in each run.',
    names: [
      'duct pressure',
      'duct loss',
      'pressure drop',
      'static pressure',
      'friction loss',
      'duct sizing',
      'Darcy',
      'Colebrook',
      'transport velocity',
      'duct diameter',
      'elbow loss',
    ],
    everyday: [
      '4 inch or 6 inch pipe',
      '100 or 150 mm duct',
      'how many bends',
      'flexible hose or pipe',
      'dust settles in the pipe',
      'long duct run',
      'hose too long',
    ],
  },
  ask: ductPressureAsk,
  request: ductPressureRequest,
  answer: ductPressureAnswer,
  solve: solveDuctPressure,
  rows,
});
