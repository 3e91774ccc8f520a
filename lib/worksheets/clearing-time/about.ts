import { askedWorksheet } from '@/lib/worksheets/ask/asked-worksheet';
import type { Cell } from '@/lib/worksheets/worksheet';
import { clearingTimeAsk } from './ask';
import { clearingTimeAnswer, clearingTimeRequest, type ClearingTimeResult } from './schema';
import { solveClearingTime } from './solve';

const five = (value: number) => Number(value.toPrecision(5));
/** A row a point; the times while a source ran are below 0. */
const rows = ({ buildUp = [], curve, curvePerfect }: ClearingTimeResult): Cell[][] => [
  ['Time (s)', 'Share left', 'Share left, perfect mixing'],
  ...buildUp.filter(({ time }) => time < 0).map(({ time, fraction }): Cell[] => [five(time), five(fraction), '']),
  ...curve.map(({ time, fraction }, i): Cell[] => [five(time), five(fraction), five(curvePerfect[i]!.fraction)]),
];

/** The clearing worksheet. */
export const clearingTime = askedWorksheet({
  about: {
    title: 'How long until it clears?',
    question: 'The job is done. How long must the fan run before anybody goes in without a mask or lifts the lid?',
    summary:
      'From volume, airflow and mixing to the time a room or cabinet takes to clear, also after a source that ran for a while.',
    names: [
      'clearing time',
      'purge time',
      'room clearance',
      'decay',
      'air changes',
      'build-up',
      'time to clear a spray booth',
      'lid wait',
    ],
    everyday: [
      'how long until it is clear',
      'when can I open the lid',
      'when may we go back in',
      'how long to air the room',
      'how long should the fan run after',
    ],
  },
  ask: clearingTimeAsk,
  request: clearingTimeRequest,
  answer: clearingTimeAnswer,
  solve: solveClearingTime,
  rows,
});
