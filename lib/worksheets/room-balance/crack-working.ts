import { infiltrationAirflow } from '@/lib/air/infiltration';
import { effectiveLeakageArea, type Leakage } from '@/lib/air/leakage';
import { celsius, metres, type SquareMetres } from '@/lib/units/quantity';
import { n, step } from '@/lib/worksheets/steps';
import type { Step } from '@/lib/worksheets/worksheet';
import type { RoomBalanceQuestion, RoomBalanceResult } from './schema';

const POWER_LAW = 'ASHRAE Fundamentals (2021), ch. 16; Sherman and Grimsrud (1980)';

/** What the cracks would let in with nothing on, by the rule for houses; none where the rule does not hold. */
function seeping({ room: { height }, air: { indoor, outdoor } }: RoomBalanceQuestion, area: SquareMetres): Step[] {
  if (height === undefined || indoor <= outdoor) return [];
  const airflow = infiltrationAirflow(area, metres(height), celsius(indoor), celsius(outdoor));
  const equation = `Q = A (51 + 0.35 H Δt) / 1000, in L/s and cm², H = ${n(height)} m, Δt = ${n(indoor - outdoor)} K`;
  const source = 'ASHRAE Fundamentals (2021), ch. 17, eq. 10: a house on a cold, windy day';
  return [step('For comparison: seeps in with nothing on', equation, airflow, 'm3/s', source)];
}

/** The lines on the cracks: their area, what they let in now, and what they would with nothing on. */
export function crackSteps(question: RoomBalanceQuestion, result: RoomBalanceResult, cracks?: Leakage): Step[] {
  const { leakage } = question.makeUp;
  if (!leakage || !cracks) return [];
  const given =
    leakage.areaAt4Pa !== undefined
      ? `area ${n(leakage.areaAt4Pa)} m² at 4 Pa`
      : `${n(leakage.ach50 ?? 0)} changes an hour of ${n(question.room.volume)} m³ at 50 Pa`;
  const area = effectiveLeakageArea(cracks);
  const through = `Q₀ (Δp / Δp₀)^0.65, ${given}, Δp = ${n(-result.roomPressure)} Pa and the column at its height`;
  return [
    step('Leakage area of the cracks', `A = Q₄ / √(2 · 4 / ρ), ${given}`, area, 'm2', POWER_LAW),
    step('Through cracks', through, result.makeUp.leakage, 'm3/s', POWER_LAW),
    ...seeping(question, area),
  ];
}
