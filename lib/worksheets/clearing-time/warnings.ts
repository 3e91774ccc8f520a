import { cautionsOf } from '@/lib/worksheets/circumstances';
import { EVEN_AIR, heavyVapour, LIMIT_IS_NO_LINE, MIXING_CONVENTION } from '@/lib/worksheets/even-air';
import type { Warning } from '@/lib/worksheets/worksheet';
import type { ClearingTimeQuestion, ClearingTimeResult } from './schema';
import type { Goal } from './working';

const when = (holds: boolean, code: string, text: string): Warning[] => (holds ? [{ code, text }] : []);

const ALWAYS: readonly Warning[] = [
  {
    code: 'planning-only',
    text: 'This is for planning. A smoke test in the room itself, with its filters at their worst, finds the time that is posted and kept; local codes and a licensed practitioner decide when a room is entered.',
  },
  {
    code: 'source-must-stop',
    text: 'It clears only once nothing gives off any more: wet paint, a cooling part, a bin of hot offcuts go on, and so long as they do the time has not begun.',
  },
  {
    code: 'people-out',
    text: 'The time is for a room that people have left: whoever stays takes in most of it in the first minutes. The air that is drawn out must not come in elsewhere.',
  },
  {
    code: 'unseen',
    text: 'Neither a clear view nor the nose tells that a room has cleared. Masks stay on until the time is over.',
  },
];

const ofGoal = ({ to }: ClearingTimeQuestion, { time, peak }: ClearingTimeResult, goal: Goal): Warning[] => [
  ...when(
    peak !== undefined && time === 0,
    'never-reached',
    'On the average of the room the source never comes to the concentration that was asked for, so no time is told. Beside the source it is many times the average: leave the fan running after it all the same.',
  ),
  ...when(
    goal.isChosen,
    'share-assumed',
    'Nothing was said of what counts as clear: a hundredth of the highest is taken (common practice, no source). A hundredth of much can still be too much: give the concentration to reach.',
  ),
  ...(to === undefined
    ? when(
        true,
        'share-is-no-limit',
        'A share says nothing of what is left of it: a hundredth of a strong start can still be over a limit.',
      )
    : [LIMIT_IS_NO_LINE]),
];

/** All there is to say of a time to clear before it is used. */
export function clearingWarnings(question: ClearingTimeQuestion, result: ClearingTimeResult, goal: Goal): Warning[] {
  return [
    ...cautionsOf(question.circumstances),
    ...when(
      (question.mixingFactor ?? 1) === 1,
      'perfect-mixing',
      'Reckoned with perfect mixing, which no room has: with a factor of 3 it takes three times as long, and corners longer.',
    ),
    ...ofGoal(question, result, goal),
    ...ALWAYS,
    ...when(
      (question.cleanAir ?? 0) > 0,
      'filter-is-for-one-thing',
      'What a filter gives counts only for what it holds back: a figure for dust or smoke says nothing of vapour and gas, and it falls as the filter loads.',
    ),
    ...heavyVapour(),
    EVEN_AIR,
    MIXING_CONVENTION,
  ];
}
