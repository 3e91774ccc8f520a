import { told, toldBoth } from '@/lib/units/show';
import { UNKNOWN_REACH } from '@/lib/air/exhaust';
import { VENT_KINDS } from '@/lib/air/vent-limits';
import type { Warning } from '@/lib/worksheets/worksheet';
import { flueWarnings } from './flue-warnings';
import type { RoomBalanceQuestion, RoomBalanceResult } from './schema';

/** An exhaust that gets less than this share of what it has alone is short: common practice, no source. */
export const SHORT_BELOW = 0.95;

const when = (holds: boolean, code: string, text: string): Warning[] => (holds ? [{ code, text }] : []);
function ofMakeUp({ makeUp }: RoomBalanceQuestion, result: RoomBalanceResult): Warning[] {
  const cracks = makeUp.leakage?.areaAt4Pa ?? makeUp.leakage?.ach50 ?? 0;
  const sealed = cracks === 0 && (makeUp.openings ?? []).length === 0;
  const short = result.exhausts.filter(({ airflow, wanted }) => airflow < SHORT_BELOW * wanted);
  const back = result.exhausts.filter(({ airflow }) => airflow < 0);
  const need = result.openingNeeded;
  return [
    ...when(
      sealed,
      'room-sealed',
      `No opening and no cracks are counted, so no more can leave than is blown in. A stated airflow is taken to give way at ${told('pressure', UNKNOWN_REACH, 'si')}.`,
    ),
    ...back.map(({ name }) => ({
      code: 'comes-back',
      text: `The room outpulls ${name}: air comes back in through it, with what it was to take away.`,
    })),
    ...when(
      short.length > 0,
      'make-up-short',
      `${short.map(({ name, airflow, wanted }) => `${name} gets ${told('airflow', airflow, 'si')} of ${told('airflow', wanted, 'si')}`).join('; ')}: too little air is let in.`,
    ),
    ...when(
      need !== null && need > 0,
      'let-more-in',
      `A further free opening of ${toldBoth('area', need ?? 0)} would hold the room. Count the free area of a grille, not its frame.`,
    ),
  ];
}

function ofHeat({ air }: RoomBalanceQuestion, { heat }: RoomBalanceResult): Warning[] {
  return when(
    heat > 2000 && air.indoor > air.outdoor,
    'heat',
    `Warming the air let in takes ${Number((heat / 1000).toPrecision(2))} kW. Do not save it by shutting the opening: capture nearer to the source and move less air.`,
  );
}

/** All there is to say of a room before its numbers are used: flues first. */
export function roomBalanceWarnings(question: RoomBalanceQuestion, result: RoomBalanceResult): Warning[] {
  const stated = question.exhausts.some(({ fan }) => !fan);
  return [
    ...flueWarnings(
      result,
      (question.appliances ?? []).map(({ vent }) => VENT_KINDS[vent].pulls),
    ),
    ...ofMakeUp(question, result),
    ...when(
      stated,
      'stated-airflow',
      'An exhaust without a curve is taken to hold its stated airflow, which few do: give its curve and duct for what it really moves.',
    ),
    ...when(
      (question.appliances ?? []).length > 0,
      'worst-case',
      'Reckoned with every exhaust on and without wind, which can do more than all of them. The heating of a flue, its dirt and its bends are not in it.',
    ),
    ...ofHeat(question, result),
  ];
}
