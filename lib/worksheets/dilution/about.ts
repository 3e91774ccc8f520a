import { TYPED_UNITS, type System } from '@/lib/units/kinds';
import { askedWorksheet } from '@/lib/worksheets/ask/asked-worksheet';
import { cell } from '@/lib/worksheets/cells';
import type { Cell } from '@/lib/worksheets/worksheet';
import { dilutionAsk } from './ask';
import { dilutionAnswer, dilutionRequest, type DilutionResult } from './schema';
import { solveDilution } from './solve';

const rows = ({ airflow, perfectMixing }: DilutionResult, system: System): Cell[][] => [
  ['Mixing', `Airflow (${TYPED_UNITS.airflow[system]})`],
  ['as asked', cell('airflow', airflow, system)],
  ['perfect', cell('airflow', perfectMixing, system)],
];

/** The dilution worksheet. */
export const dilution = askedWorksheet({
  about: {
    title: 'How much air thins it?',
    question: 'It gives off this much, or this much liquid dries. How much fresh air keeps the room below the limit?',
    summary:
      'From a release, or a liquid that evaporates, and a limit to the airflow of general ventilation, with the mixing factor said.',
    names: [
      'dilution ventilation',
      'general ventilation',
      'air changes needed',
      'ACH',
      'evaporation rate',
      'mixing factor',
      'solvent evaporation',
      'thinning',
    ],
    everyday: [
      'how many air changes do I need',
      'is an open window enough',
      'solvent dries in the room',
      'glue smell in the room',
      'how much fresh air',
    ],
  },
  ask: dilutionAsk,
  request: dilutionRequest,
  answer: dilutionAnswer,
  solve: solveDilution,
  rows,
});
