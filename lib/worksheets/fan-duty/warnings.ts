import { systemLoss } from '@/lib/air/duct-system';
import { cubicMetresPerSecond } from '@/lib/units/quantity';
import { told, toldBoth } from '@/lib/units/show';
import { ductWarnings } from '@/lib/worksheets/duct-warnings';
import type { Warning } from '@/lib/worksheets/worksheet';
import type { FanDutyQuestion, FanDutyResult } from './schema';
import type { Solved } from './solve';

/** A machine that gets less than this share of what it needs starves: common practice, no source. */
export const STARVES_BELOW = 0.9;

const when = (holds: boolean, code: string, text: string): Warning[] => (holds ? [{ code, text }] : []);

function ofMeeting({ meeting }: Solved): Warning[] {
  const several = meeting.crossings.map(({ airflow }) => told('airflow', airflow, 'si')).join(' and ');
  return [
    ...when(
      meeting.crossings.length > 1,
      'several-meetings',
      `The curve has a hump and meets the system at ${several}: which one the fan settles in is not known. The lower one is told.`,
    ),
    ...when(
      meeting.stall,
      'stall',
      'The fan works left of the peak of its curve, where many surge, rumble and lose air. Ask its maker, or ease the system.',
    ),
    ...when(
      meeting.beyond,
      'beyond-curve',
      'The system is so easy that the fan runs past the last point of its curve: the answer goes on in a straight line and is a guess.',
    ),
  ];
}

function ofSpeed({ fan, targetAirflow }: FanDutyQuestion, { speedForAirflow }: FanDutyResult): Warning[] {
  return [
    ...when(
      (fan.speed ?? 1) !== 1 || targetAirflow !== undefined,
      'duty-is-not-speed',
      'Speed is that of the wheel, measured. Half the setting of a control is not half the speed, and the fan laws know nothing of settings.',
    ),
    ...when(
      speedForAirflow === null || (speedForAirflow ?? 0) > 1,
      'too-weak',
      'This fan does not reach the airflow wanted at its full speed through this duct. Ease the duct, or take another fan; do not run one past its rated speed.',
    ),
  ];
}

function ofBranches({ branches = [] }: FanDutyResult): Warning[] {
  const starving = branches.filter(
    ({ gate, airflow, wanted }) => gate === 'open' && wanted && airflow < STARVES_BELOW * wanted,
  );
  const back = branches.filter(({ airflow }) => airflow < 0);
  return [
    ...back.map(({ name, airflow }) => ({
      code: 'comes-back',
      text: `Air comes out of ${name} into the room, ${toldBoth('airflow', -airflow)}: with it comes what others put into the duct. A tight gate or a non-return damper, and its own way for air into that room.`,
    })),
    ...starving.map(({ name, airflow, wanted }) => ({
      code: 'starves',
      text: `${name} gets ${toldBoth('airflow', airflow)} of the ${toldBoth('airflow', wanted!)} it needs.`,
    })),
    ...when(
      branches.length > 1,
      'fan-off',
      'With the fan off nothing holds the smoke of one machine out of another: whatever blows, or draws, on one hood moves air through the rest. Shut the gates.',
    ),
  ];
}

/** All there is to say of a fan on its system before the number is used. */
export function fanDutyWarnings(question: FanDutyQuestion, solved: Solved, result: FanDutyResult): Warning[] {
  const { system, air } = solved;
  const loss = systemLoss(system, cubicMetresPerSecond(Math.max(result.airflow, 1e-6)), air);
  return [
    ...when(result.airflow <= 0, 'no-air', 'No air moves, or it comes back: the room pulls harder than the fan.'),
    ...ofBranches(result),
    ...ofMeeting(solved),
    ...ofSpeed(question, result),
    ...when(
      solved.loaded !== undefined,
      'filter-loads',
      'The airflow falls as the filter loads: size for the loaded one, and mark the reading at which it is changed.',
    ),
    ...ductWarnings(system, loss).filter(({ code }) => code !== 'no-filter' || !question.branches),
    ...when(
      true,
      'free-air-figure',
      'The airflow on a fan’s label is without any duct. A maker’s curve is of a new, clean fan in clean air.',
    ),
  ];
}
