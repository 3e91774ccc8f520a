import type { Balance, Room } from '@/lib/air/room-balance';
import { n, step } from '@/lib/worksheets/steps';
import type { Step } from '@/lib/worksheets/worksheet';
import { crackSteps } from './crack-working';
import { flueSteps, openingSteps } from './flue-working';
import type { RoomBalanceQuestion, RoomBalanceResult } from './schema';

const MASS = 'Mass balance, solved for the pressure between brackets';
const GAS = 'Ideal gas; ICAO standard atmosphere';

function airSteps({ air }: RoomBalanceQuestion, { indoor, outdoor }: Room): Step[] {
  return [
    step('Density of the air indoors', `ρ = p / (R T), ${n(air.indoor)} °C`, indoor, 'kg/m3', GAS),
    step('Density of the air outdoors', `ρ = p / (R T), ${n(air.outdoor)} °C`, outdoor, 'kg/m3', GAS),
  ];
}

const leavingOf = ({ exhausts }: RoomBalanceResult) => exhausts.reduce((sum, { airflow }) => sum + airflow, 0);

function leavingSteps(result: RoomBalanceResult): Step[] {
  const sum = result.exhausts.map(({ airflow }) => n(airflow)).join(' + ') || '0';
  return [
    ...result.exhausts.map(({ name, airflow, wanted }) =>
      step(`Leaves by ${name}`, `alone ${n(wanted)} m³/s, against this pressure`, airflow, 'm3/s', MASS),
    ),
    step('All that leaves', sum, leavingOf(result), 'm3/s', MASS),
  ];
}

function letInSteps(question: RoomBalanceQuestion, room: Room, result: RoomBalanceResult): Step[] {
  const { openings = [], supply } = question.makeUp;
  const { makeUp: got, roomPressure } = result;
  const areas = openings.map(({ area }) => n(area)).join(' + ');
  const through = `Σ Cd A √(2 Δp / ρ), A = ${areas} m², Δp = ${n(-roomPressure)} Pa and the column at its height`;
  const orifice = 'ASHRAE Fundamentals (2021), ch. 16; Cd 0.6 where none is given';
  return [
    ...(supply ? [step('Blown in', 'as given, outdoor air, warmed to the room', got.supply, 'm3/s', 'As given')] : []),
    ...(openings.length > 0 ? [step('Through the openings', through, got.openings, 'm3/s', orifice)] : []),
    ...crackSteps(question, result, room.leakage),
    step('All that is let in', 'supply + openings + cracks', got.total, 'm3/s', MASS),
  ];
}

function consequences({ air, room: { volume } }: RoomBalanceQuestion, room: Room, result: RoomBalanceResult): Step[] {
  const changes = `3600 Q / V = 3600 × ${n(leavingOf(result))} / ${n(volume)}`;
  const warming = `${n(room.indoor)} × ${n(result.makeUp.total)} × 1006 × (${n(air.indoor)} − ${n(air.outdoor)})`;
  return [
    step('Air changes an hour', changes, result.airChangesPerHour, '1/h', 'Its definition'),
    step(
      'Heat for the air let in',
      `P = ρ Q cp (t in − t out) = ${warming}`,
      result.heat,
      'W',
      'ASHRAE Fundamentals (2021), ch. 17',
    ),
  ];
}

/** The working: what leaves, what is let in, the pressure between them, the flues. */
export function roomBalanceSteps(
  question: RoomBalanceQuestion,
  room: Room,
  balance: Balance,
  result: RoomBalanceResult,
): Step[] {
  const meeting = 'ρ indoors Σ Q exhaust(p) = ρ Σ Q in(p)';
  return [
    ...airSteps(question, room),
    step('Pressure of the room against outdoors', meeting, balance.pressure, 'Pa', MASS),
    ...leavingSteps(result),
    ...letInSteps(question, room, result),
    ...consequences(question, room, result),
    ...flueSteps(question, result),
    ...openingSteps(question, result),
  ];
}
