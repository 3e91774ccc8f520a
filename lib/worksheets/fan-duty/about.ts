import { TYPED_UNITS, type System } from '@/lib/units/kinds';
import { askedWorksheet } from '@/lib/worksheets/ask/asked-worksheet';
import { cell } from '@/lib/worksheets/cells';
import type { Cell } from '@/lib/worksheets/worksheet';
import { fanDutyAsk } from './ask';
import { fanDutyAnswer, fanDutyRequest, type FanDutyResult } from './schema';
import { solveFanDuty } from './solve';

/** Both curves as rows for a spreadsheet. */
function rows({ curves }: FanDutyResult, system: System): Cell[][] {
  const [flow, pressure] = [TYPED_UNITS.airflow[system], TYPED_UNITS.pressure[system]];
  const lines = curves.fan.map(({ airflow, staticPressure }, i): Cell[] => [
    cell('airflow', airflow, system),
    cell('pressure', staticPressure, system),
    cell('pressure', curves.system[i]!.staticPressure, system),
  ]);
  return [[`Airflow (${flow})`, `Fan (${pressure})`, `System (${pressure})`], ...lines];
}

/** The fan worksheet. */
export const fanDuty = askedWorksheet({
  about: {
    title: 'What does this fan really move?',
    question:
      'My fan says this much on its label. What do I get through my hood, hose and filter, and when the filter is full?',
    summary:
      'From a fan’s curve and its duct to the airflow where the two meet, with a loaded filter, a wanted airflow, or several machines on one fan.',
    names: [
      'fan duty',
      'operating point',
      'fan curve',
      'system curve',
      'fan laws',
      'fan speed',
      'inline fan',
      'duct fan',
      'two fans',
      'branches on one fan',
      'blast gate',
      'free air cfm',
    ],
    everyday: [
      'fan barely pulls',
      'fan says 800 but',
      'weak suction',
      'which fan do I need',
      'several machines on one extractor',
      'smoke comes out of the other machine',
      'booster fan',
      'filter clogged',
    ],
  },
  ask: fanDutyAsk,
  request: fanDutyRequest,
  answer: fanDutyAnswer,
  solve: solveFanDuty,
  rows,
});
