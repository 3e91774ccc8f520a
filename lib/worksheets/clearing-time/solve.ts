import { airChanges } from '@/lib/air/air-changes';
import { concentrationAfter } from '@/lib/air/build-up';
import { remaining, timeUntil } from '@/lib/air/decay';
import { cubicMetres, cubicMetresPerSecond, milligramsPerSecond, seconds } from '@/lib/units/quantity';
import { cautionsOf } from '@/lib/worksheets/circumstances';
import { n, step } from '@/lib/worksheets/steps';
import type { Answer, Step, Warning } from '@/lib/worksheets/worksheet';
import type { ClearingTimeQuestion, ClearingTimeResult } from './schema';

const CDC = 'CDC, MMWR 1994;43(RR-13), Table S3-1';
const ACGIH = 'ACGIH Industrial Ventilation, 24th ed. (2001), ch. 2';
const POINTS = 60;
/** What a room is cleared to where nothing is said after a source: common practice, no source. */
export const CLEARED = 0.01;

type Room = { airflow: ReturnType<typeof cubicMetresPerSecond>; volume: ReturnType<typeof cubicMetres> };

/** The highest after a source, mg/m3, with the same mixing all the while. */
const peakOf = ({ massRate, duration = 0 }: ClearingTimeQuestion, room: Room, mixing: number) =>
  massRate === undefined
    ? undefined
    : concentrationAfter({ generation: milligramsPerSecond(massRate), mixing, ...room }, seconds(duration));

/** The share that is left when it counts as clear. */
function shareOf({ removal, from, to }: ClearingTimeQuestion, peak?: number): number {
  if (removal !== undefined) return 1 - removal;
  if (from !== undefined) return (to ?? 0) / from;
  return to === undefined || peak === undefined ? CLEARED : Math.min(1, to / peak);
}

const curveOf = (end: number, room: Room, mixing: number) =>
  Array.from({ length: POINTS + 1 }, (_, i) => {
    const time = seconds((end * i) / POINTS);
    return { time, fraction: remaining(room.airflow, room.volume, time, mixing) };
  });

function stepsOf(question: ClearingTimeQuestion, mixing: number, share: number, result: ClearingTimeResult): Step[] {
  const { airflow, volume, massRate, duration = 0 } = question;
  return [
    step('Air changes an hour', `n = 3600 Q / V = 3600 × ${n(airflow)} / ${n(volume)}`, result.airChanges, '1/h', CDC),
    ...(result.peak === undefined
      ? []
      : [
          step(
            'Concentration when the source stops',
            `C = (G K / Q)(1 − e^(−Q t / (K V))), G = ${n(massRate!)} mg/s, t = ${n(duration)} s`,
            result.peak,
            'mg/m3',
            ACGIH,
          ),
        ]),
    step(
      'Share that is left when clear',
      question.removal === undefined ? 'to / from' : '1 − removal',
      share,
      '',
      'As given',
    ),
    step(
      'Time until clear',
      `t = −K (V / Q) ln(share) = −${n(mixing)} × (${n(volume)} / ${n(airflow)}) × ln(${n(share)})`,
      result.time,
      's',
      `${CDC}; ${ACGIH}`,
    ),
    step('With perfect mixing', `t / K = ${n(result.time)} / ${n(mixing)}`, result.perfectMixing, 's', CDC),
  ];
}

const WARNINGS: readonly Warning[] = [
  {
    code: 'planning-only',
    text: 'This is for planning. A smoke test in the room itself, with its filters at their worst, finds the time that is posted and kept.',
  },
  {
    code: 'source-must-stop',
    text: 'It clears only once nothing gives off any more: wet paint, a cooling part, a bin of hot offcuts go on.',
  },
  {
    code: 'unseen',
    text: 'Neither a clear view nor the nose tells that a room has cleared. Masks stay on until the time is over.',
  },
];

/**
 * How long a room takes to clear; with perfect mixing, and a warning, where no factor is given. SI in, SI out.
 * @param question admitted by `clearingTimeRequest`
 */
export function solveClearingTime(question: ClearingTimeQuestion): Answer<ClearingTimeResult> {
  const mixing = question.mixingFactor ?? 1;
  const room: Room = { airflow: cubicMetresPerSecond(question.airflow), volume: cubicMetres(question.volume) };
  const peak = peakOf(question, room, mixing);
  const share = shareOf(question, peak);
  const time = timeUntil(share, room.airflow, room.volume, mixing);
  const shown = time > 0 ? time * 1.25 : (room.volume / room.airflow) * mixing;
  const result: ClearingTimeResult = {
    ...{ time, airChanges: airChanges(room.airflow, room.volume), perfectMixing: time / mixing },
    ...{ curve: curveOf(shown, room, mixing), curvePerfect: curveOf(shown, room, 1) },
    ...(peak === undefined ? {} : { peak }),
  };
  const assumed: Warning[] =
    mixing === 1
      ? [
          {
            code: 'perfect-mixing',
            text: 'Reckoned with perfect mixing, which no room has: with a factor of 3 it takes three times as long, and corners longer.',
          },
        ]
      : [];
  return {
    result,
    steps: stepsOf(question, mixing, share, result),
    warnings: [...cautionsOf(question.circumstances), ...assumed, ...WARNINGS],
  };
}
