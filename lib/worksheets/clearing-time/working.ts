import { ACGIH, n, PRACTICE, step } from '@/lib/worksheets/steps';
import type { Step } from '@/lib/worksheets/worksheet';
import type { Room } from './room';
import type { ClearingTimeQuestion, ClearingTimeResult } from './schema';

const CDC = 'CDC, MMWR 1994;43(RR-13), Table S3-1';
const BALANCE = `${ACGIH}, ch. 2`;

/** What is left of the start when it counts as clear, and how that is said. */
export type Goal = { share: number; equation: string; isChosen: boolean };

function airSteps({ airflow, volume, cleanAir }: ClearingTimeQuestion, room: Room, result: ClearingTimeResult): Step[] {
  const { airChanges, equivalentAirChanges } = result;
  const changes = step(
    'Air changes an hour',
    `n = 3600 Q / V = 3600 × ${n(airflow)} / ${n(volume)}`,
    airChanges,
    '1/h',
    CDC,
  );
  if (equivalentAirChanges === undefined) return [changes];
  return [
    changes,
    step('Air that clears it', `Q + CADR = ${n(airflow)} + ${n(cleanAir!)}`, room.airflow, 'm3/s', CDC),
    step(
      'Air changes an hour with the filter',
      `3600 (Q + CADR) / V = 3600 × ${n(room.airflow)} / ${n(volume)}`,
      equivalentAirChanges,
      '1/h',
      CDC,
    ),
  ];
}

function sourceSteps(question: ClearingTimeQuestion, room: Room, { peak, steady }: ClearingTimeResult): Step[] {
  const { massRate, duration } = question;
  if (peak === undefined || steady === undefined) return [];
  return [
    step(
      'Concentration that the source would come to',
      `C = K G / Q = ${n(room.mixing)} × ${n(massRate!)} / ${n(room.airflow)}`,
      steady,
      'mg/m3',
      BALANCE,
    ),
    step(
      'Concentration when the source stops',
      `C (1 − e^(−Q t / (K V))) = ${n(steady)} × (1 − e^(−${n(room.airflow)} × ${n(duration!)} / (${n(room.mixing)} × ${n(room.volume)})))`,
      peak,
      'mg/m3',
      BALANCE,
    ),
  ];
}

/** The working of a time to clear, line by line. */
export function clearingSteps(
  question: ClearingTimeQuestion,
  room: Room,
  goal: Goal,
  result: ClearingTimeResult,
): Step[] {
  const { time, perfectMixing } = result;
  const { mixing, volume, airflow } = room;
  return [
    ...airSteps(question, room, result),
    ...sourceSteps(question, room, result),
    step('Share that is left when clear', goal.equation, goal.share, '', goal.isChosen ? PRACTICE : 'As given'),
    step(
      'Time until clear',
      `t = −K (V / Q) ln(share) = −${n(mixing)} × (${n(volume)} / ${n(airflow)}) × ln(${n(goal.share)})`,
      time,
      's',
      `${CDC}; ${BALANCE}`,
    ),
    step('With perfect mixing', `t / K = ${n(time)} / ${n(mixing)}`, perfectMixing, 's', CDC),
  ];
}
