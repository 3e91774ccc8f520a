import { TYPED_UNITS, type System } from '@/lib/units/kinds';
import { askedWorksheet } from '@/lib/worksheets/ask/asked-worksheet';
import { cell } from '@/lib/worksheets/cells';
import type { Cell } from '@/lib/worksheets/worksheet';
import { roomBalanceAsk } from './ask';
import { roomBalanceAnswer, roomBalanceRequest, type RoomBalanceResult } from './schema';
import { solveRoomBalance } from './solve';

/** All that moves the air of the room, as rows for a spreadsheet. */
function rows({ exhausts, makeUp, roomPressure, appliances }: RoomBalanceResult, system: System): Cell[][] {
  const flow = (value: number) => cell('airflow', value, system);
  const unit = TYPED_UNITS.airflow[system];
  return [
    ['Way', `Airflow (${unit})`, `Alone (${unit})`],
    ...exhausts.map(({ name, airflow, wanted }): Cell[] => [`Out: ${name}`, flow(airflow), flow(wanted)]),
    ...(['supply', 'openings', 'leakage', 'total'] as const).map((way): Cell[] => [
      `In: ${way}`,
      flow(makeUp[way]),
      '',
    ]),
    [`Room pressure (${TYPED_UNITS.pressure[system]})`, cell('pressure', roomPressure, system), ''],
    ...appliances.map(({ name, draught, spills }): Cell[] => [
      `Flue of ${name} pulls (${TYPED_UNITS.pressure[system]})`,
      draught === null ? 'not known' : cell('pressure', draught, system),
      spills ? 'spills' : 'not beaten by this sum',
    ]),
  ];
}

/** The room worksheet. */
export const roomBalance = askedWorksheet({
  about: {
    title: 'Does the room let in what leaves it?',
    question:
      'With everything on, how far below outdoors does the room go, what does each fan still move, and does the flue still draw?',
    summary:
      'Exhausts, supply, openings, cracks and flues of one room solved together: its pressure, what each exhaust gets, and whether a flue is beaten.',
    names: [
      'room balance',
      'make-up air',
      'makeup air',
      'depressurisation',
      'depressurization',
      'negative pressure',
      'backdraft',
      'flue spillage',
      'combustion air',
      'replacement air',
      'heat loss of ventilation',
    ],
    everyday: [
      'door hard to open',
      'door slams',
      'whistling door',
      'exhaust fan and water heater',
      'smoke from the stove comes into the room',
      'where does the air come from',
      'boiler in the workshop',
      'cold workshop in winter',
    ],
  },
  ask: roomBalanceAsk,
  request: roomBalanceRequest,
  answer: roomBalanceAnswer,
  solve: solveRoomBalance,
  rows,
});
