import { VENT_KINDS } from '@/lib/air/vent-limits';
import { n, PRACTICE, step } from '@/lib/worksheets/steps';
import type { Step } from '@/lib/worksheets/worksheet';
import { heldAt } from './flues';
import type { RoomBalanceQuestion, RoomBalanceResult } from './schema';

/** The lines on each flued appliance: what its flue pulls, where its height is known, and its limit. */
export function flueSteps({ appliances = [], air }: RoomBalanceQuestion, result: RoomBalanceResult): Step[] {
  return result.appliances.flatMap(({ name, draught, limit }, i) => {
    const { vent, flueHeight = 0, flueTemperature } = appliances[i]!;
    const at = flueTemperature === undefined ? `a cold flue at ${n(air.indoor)}` : n(flueTemperature);
    const equation = `Δp = g (ρ outdoors − ρ flue) H, ${at} °C in the flue, H = ${n(flueHeight)} m`;
    const source = 'ASHRAE Fundamentals (2021), ch. 21, eq. 9';
    return [
      ...(draught === null ? [] : [step(`Draught of the ${name}`, equation, draught, 'Pa', source)]),
      step(`Limit of the ${name}`, 'table by the kind of vent', limit, 'Pa', VENT_KINDS[vent].source),
    ];
  });
}

/** The line on the opening that would hold the room; none where it is held. */
export function openingSteps(question: RoomBalanceQuestion, { openingNeeded }: RoomBalanceResult): Step[] {
  if (openingNeeded === null) return [];
  const equation = `A = Q lacking / (Cd √(2 Δp / ρ)), Δp = ${n(-heldAt(question))} Pa: the strictest of limits, draughts and 5 Pa`;
  const source = `ASHRAE Fundamentals (2021), ch. 16; 5 Pa for doors: ${PRACTICE.toLowerCase()}`;
  return [step('Further free opening needed', equation, openingNeeded, 'm2', source)];
}
