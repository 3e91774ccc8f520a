import type { Balance, Room } from '@/lib/air/room-balance';
import { VENT_KINDS } from '@/lib/air/vent-limits';
import { n, PRACTICE, step } from '@/lib/worksheets/steps';
import type { Step } from '@/lib/worksheets/worksheet';
import type { RoomBalanceQuestion, RoomBalanceResult } from './schema';

const MASS = 'Mass balance, solved for the pressure between brackets';
const ASHRAE = 'ASHRAE Fundamentals (2021), ch. 16';
const STACK = 'ASHRAE Fundamentals (2021), ch. 21, eq. 9';

function letIn(
  { makeUp, room: { volume } }: RoomBalanceQuestion,
  { makeUp: got }: RoomBalanceResult,
  balance: Balance,
): Step[] {
  const p = n(-balance.pressure);
  const { openings = [], leakage, supply } = makeUp;
  const cracks =
    leakage?.areaAt4Pa !== undefined
      ? `area ${n(leakage.areaAt4Pa)} m² at 4 Pa`
      : `${n(leakage?.ach50 ?? 0)} changes an hour of ${n(volume)} m³ at 50 Pa`;
  return [
    ...(supply ? [step('Blown in', 'as given, outdoor air, warmed to the room', got.supply, 'm3/s', 'As given')] : []),
    ...(openings.length > 0
      ? [
          step(
            'Through the openings',
            `Σ Cd A √(2 Δp / ρ), A = ${openings.map(({ area }) => n(area)).join(' + ')} m², Δp = ${p} Pa and the column at its height`,
            got.openings,
            'm3/s',
            `${ASHRAE}; Cd 0.6 where none is given`,
          ),
        ]
      : []),
    ...(leakage
      ? [
          step(
            'Through cracks',
            `Q₀ (Δp / Δp₀)^0.65, ${cracks}`,
            got.leakage,
            'm3/s',
            `${ASHRAE}; Sherman and Grimsrud (1980)`,
          ),
        ]
      : []),
    step('All that is let in', 'supply + openings + cracks', got.total, 'm3/s', MASS),
  ];
}

function flues({ appliances = [], air }: RoomBalanceQuestion, result: RoomBalanceResult): Step[] {
  return result.appliances.flatMap(({ name, draught, limit }, i) => {
    const { vent, flueHeight, flueTemperature } = appliances[i]!;
    const at = flueTemperature === undefined ? `a cold flue at ${n(air.indoor)}` : n(flueTemperature);
    return [
      ...(draught === null
        ? []
        : [
            step(
              `Draught of the ${name}`,
              `Δp = g (ρ outdoors − ρ flue) H, ${at} °C in the flue, H = ${n(flueHeight!)} m`,
              draught,
              'Pa',
              STACK,
            ),
          ]),
      step(`Limit of the ${name}`, 'table by the kind of vent', limit, 'Pa', VENT_KINDS[vent].source),
    ];
  });
}

/** The working: what leaves, what is let in, the pressure between them, the flues. */
export function roomBalanceSteps(
  question: RoomBalanceQuestion,
  room: Room,
  balance: Balance,
  result: RoomBalanceResult,
): Step[] {
  const leaves = result.exhausts.reduce((sum, { airflow }) => sum + airflow, 0);
  return [
    step(
      'Density of the air indoors',
      `ρ = p / (R T), ${n(question.air.indoor)} °C`,
      room.indoor,
      'kg/m3',
      'Ideal gas; ICAO standard atmosphere',
    ),
    step(
      'Density of the air outdoors',
      `ρ = p / (R T), ${n(question.air.outdoor)} °C`,
      room.outdoor,
      'kg/m3',
      'Ideal gas; ICAO standard atmosphere',
    ),
    step(
      'Pressure of the room against outdoors',
      'ρ indoors Σ Q exhaust(p) = ρ Σ Q in(p)',
      balance.pressure,
      'Pa',
      MASS,
    ),
    ...result.exhausts.map(({ name, airflow, wanted }) =>
      step(`Leaves by ${name}`, `alone ${n(wanted)} m³/s, against this pressure`, airflow, 'm3/s', MASS),
    ),
    step('All that leaves', result.exhausts.map(({ airflow }) => n(airflow)).join(' + ') || '0', leaves, 'm3/s', MASS),
    ...letIn(question, result, balance),
    step(
      'Air changes an hour',
      `3600 Q / V = 3600 × ${n(leaves)} / ${n(question.room.volume)}`,
      result.airChangesPerHour,
      '1/h',
      'Its definition',
    ),
    step(
      'Heat for the air let in',
      `P = ρ Q cp (t in − t out) = ${n(room.indoor)} × ${n(result.makeUp.total)} × 1006 × (${n(question.air.indoor)} − ${n(question.air.outdoor)})`,
      result.heat,
      'W',
      'ASHRAE Fundamentals (2021), ch. 17',
    ),
    ...flues(question, result),
    ...(result.openingNeeded === null
      ? []
      : [
          step(
            'Further free opening needed',
            'A = Q lacking / (Cd √(2 Δp / ρ)), at the strictest limit or 5 Pa',
            result.openingNeeded,
            'm2',
            `${ASHRAE}; 5 Pa for doors: ${PRACTICE.toLowerCase()}`,
          ),
        ]),
  ];
}
