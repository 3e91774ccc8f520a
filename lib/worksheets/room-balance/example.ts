import type { RoomBalanceQuestion } from './schema';

/** A question to look at before one's own. The room and all in it are invented. */
export const ROOM_BALANCE_EXAMPLE: RoomBalanceQuestion = {
  room: { volume: 62, height: 2.6 },
  air: { indoor: 20, outdoor: 2 },
  exhausts: [
    { name: 'laser cutter', airflow: 0.16 },
    { name: 'printer cabinet', airflow: 0.03 },
  ],
  makeUp: { openings: [{ area: 0.02, height: 2.1 }], leakage: { ach50: 6 } },
  appliances: [{ name: 'water heater', vent: 'natural-draught', flueHeight: 5, flueTemperature: 90 }],
};
