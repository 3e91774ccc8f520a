import { airChanges } from '@/lib/air/air-changes';
import { steadyConcentration } from '@/lib/air/build-up';
import { equivalentAirChanges } from '@/lib/air/cleaner';
import { timeUntil } from '@/lib/air/decay';
import { cubicMetresPerSecond, milligramsPerSecond } from '@/lib/units/quantity';
import { n } from '@/lib/worksheets/steps';
import type { Answer } from '@/lib/worksheets/worksheet';
import { buildUpOf, concentrationOf, decayOf, roomOf, type Room } from './room';
import type { ClearingTimeQuestion, ClearingTimeResult } from './schema';
import { clearingWarnings } from './warnings';
import { clearingSteps, type Goal } from './working';

/** What a room is cleared to where nothing is said after a source: common practice, no source. */
export const CLEARED = 0.01;
/** How much more than the time asked for is drawn. */
const SHOWN = 1.25;

/** The share that is left when it counts as clear: all of it where a source never came so high. */
function goalOf({ removal, from, to }: ClearingTimeQuestion, peak: number): Goal {
  if (removal !== undefined) return { share: 1 - removal, equation: `1 − removal = 1 − ${removal}`, isChosen: false };
  if (to === undefined) return { share: CLEARED, equation: 'a hundredth of the highest', isChosen: true };
  const start = from ?? peak;
  return {
    share: to < start ? to / start : 1,
    equation: `to / from = ${n(to)} / ${n(start)}, at most 1`,
    isChosen: false,
  };
}

/** What a source that ran for a while has left, with how it rose; nothing where none ran. */
function sourceOf({ massRate, duration }: ClearingTimeQuestion, room: Room, shown: number) {
  if (massRate === undefined || duration === undefined) return {};
  return {
    peak: concentrationOf(room, massRate, duration),
    steady: steadyConcentration({ generation: milligramsPerSecond(massRate), ...room }),
    buildUp: buildUpOf(room, duration, shown),
  };
}

/**
 * How long a room takes to clear; with perfect mixing, and a warning, where no factor is given. SI in, SI out.
 * @param question admitted by `clearingTimeRequest`; sources of the equations stand in lib/air and in the steps
 */
export function solveClearingTime(question: ClearingTimeQuestion): Answer<ClearingTimeResult> {
  const { airflow, cleanAir = 0, massRate = 0, duration = 0 } = question;
  const room = roomOf(question);
  const goal = goalOf(question, concentrationOf(room, massRate, duration));
  const time = timeUntil(goal.share, room.airflow, room.volume, room.mixing);
  const shown = time > 0 ? time * SHOWN : (room.mixing * room.volume) / room.airflow;
  const result: ClearingTimeResult = {
    ...{ time, airChanges: airChanges(cubicMetresPerSecond(airflow), room.volume) },
    ...(cleanAir > 0 ? { equivalentAirChanges: equivalentAirChanges(room.airflow, room.volume) } : {}),
    ...{ curve: decayOf(room, shown), curvePerfect: decayOf({ ...room, mixing: 1 }, shown) },
    perfectMixing: time / room.mixing,
    ...sourceOf(question, room, shown),
  };
  return {
    result,
    steps: clearingSteps(question, room, goal, result),
    warnings: clearingWarnings(question, result, goal),
  };
}
