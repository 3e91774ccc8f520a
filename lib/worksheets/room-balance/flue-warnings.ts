import { toldBoth } from '@/lib/units/show';
import type { Warning } from '@/lib/worksheets/worksheet';
import { FAINT } from './flues';
import type { RoomBalanceResult } from './schema';

type Flue = RoomBalanceResult['appliances'][number];

const pascals = (value: number) => toldBoth('pressure', Math.abs(value));

/** What a flue does by itself, in a sentence; none where its height is not known. */
function pullOf({ draught }: Flue): string {
  if (draught === null) return '';
  if (draught < 0) return ` Its flue is the heavier column and pulls ${pascals(draught)} down, into the room.`;
  return ` Its flue pulls ${pascals(draught)}.`;
}

function spilling(flue: Flue, pressure: number, pulls: boolean): Warning {
  const stands = `${pascals(pressure)} ${pressure > 0 ? 'above' : 'below'} outdoors`;
  const idle = pulls && flue.draught !== null && flue.draught < FAINT;
  const helps = idle
    ? 'No opening makes this flue draw: it must be warm before it is relied on.'
    : 'Let more air in or take the exhaust away.';
  return {
    code: 'flue-spills',
    text: `With everything on, the room is ${stands}: the ${flue.name} is at the point of sending its gas, with carbon monoxide, into the room.${pullOf(flue)} Its limit is ${pascals(flue.limit)}. Do not run these exhausts with it lit. ${helps} Have a licensed person test the draught in the worst case.`,
  };
}

/** Over half of the way to its limit, or half of its draught used up. */
const near = ({ limit, draught }: Flue, pressure: number, pulls: boolean) =>
  pressure < limit / 2 || (pulls && draught !== null && -pressure >= draught / 2);

/** What is to be said of each appliance; `pulls` tells of each whether nothing but its draught takes its gas away. */
export function flueWarnings({ appliances, roomPressure }: RoomBalanceResult, pulls: readonly boolean[]): Warning[] {
  return appliances.flatMap((flue, i) => {
    if (flue.spills) return [spilling(flue, roomPressure, pulls[i]!)];
    if (!near(flue, roomPressure, pulls[i]!)) return [];
    return [
      {
        code: 'flue-near',
        text: `The room is over half the way to what turns the ${flue.name}: its limit is ${pascals(flue.limit)}.${pullOf(flue)} Wind, another fan or a shut door may do the rest.`,
      },
    ];
  });
}
