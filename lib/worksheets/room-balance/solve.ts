import { airChanges } from '@/lib/air/air-changes';
import { makeUpHeat } from '@/lib/air/make-up-heat';
import type { Exhaust } from '@/lib/air/exhaust';
import type { NetworkExhaust } from '@/lib/air/network-exhaust';
import { openingFor } from '@/lib/air/orifice';
import { balanceRoom, letInAt, type Room } from '@/lib/air/room-balance';
import { celsius, cubicMetres, cubicMetresPerSecond } from '@/lib/units/quantity';
import { cautionsOf } from '@/lib/worksheets/circumstances';
import type { Answer } from '@/lib/worksheets/worksheet';
import { fluesOf, heldAt } from './flues';
import { roomOf } from './room';
import type { RoomBalanceQuestion, RoomBalanceResult } from './schema';
import { roomBalanceWarnings } from './warnings';
import { roomBalanceSteps } from './working';

/** Free opening, m2, that would let in what is lacking where the room is to be held: what leaves there less what comes in there. */
function openingNeeded(room: Room, pressure: number, limit: number): number | null {
  if (pressure >= limit) return null;
  const leaves = room.exhausts.reduce((sum, exhaust) => sum + exhaust.airflowAt(limit), 0);
  const lacking = Math.max(0, leaves - letInAt(room, limit));
  const outdoors = cubicMetresPerSecond((lacking * room.indoor) / room.outdoor);
  return openingFor(outdoors, -limit, room.outdoor);
}

/**
 * The pressure a room comes to with every exhaust on, what each then gets, and whether a flue is beaten: all solved together.
 * SI in, SI out. @param question admitted by `roomBalanceRequest`
 */
export function solveRoomBalance(question: RoomBalanceQuestion): Answer<RoomBalanceResult> {
  const room = roomOf(question);
  const balance = balanceRoom(room);
  const { pressure, exhausts, supply, openings, leakage } = balance;
  const leaves = exhausts.reduce((sum: number, { airflow }) => sum + airflow, 0);
  const wanted = exhausts.reduce((sum: number, each) => sum + each.wanted, 0);
  const { indoor, outdoor } = question.air;
  const total = supply + openings + leakage;
  const result: RoomBalanceResult = {
    roomPressure: pressure,
    exhausts: exhausts.map(({ name, airflow, wanted: asked }, i) => ({
      ...{ name, airflow, wanted: asked },
      ...sharesOf(room.exhausts[i]!, pressure),
    })),
    makeUp: { supply, openings, leakage, total },
    shortfall: Math.max(0, wanted - leaves),
    airChangesPerHour: airChanges(cubicMetresPerSecond(Math.max(0, leaves)), cubicMetres(question.room.volume)),
    appliances: fluesOf(question, pressure),
    heat: makeUpHeat(cubicMetresPerSecond(Math.max(0, total)), room.indoor, celsius(indoor), celsius(outdoor)),
    openingNeeded: openingNeeded(room, pressure, heldAt(question)),
  };
  return {
    result,
    steps: roomBalanceSteps(question, room, balance, result),
    warnings: [...cautionsOf(circumstancesOf(question)), ...roomBalanceWarnings(question, result)],
  };
}

/** How the machines of one exhaust share it at the pressure of the room; nothing for an exhaust of its own. */
const sharesOf = (exhaust: Exhaust, pressure: number) =>
  'branchesAt' in exhaust
    ? {
        branches: (exhaust as NetworkExhaust).branchesAt(pressure).map(({ name, open, airflow }) => ({
          ...{ name, airflow, gate: open ? ('open' as const) : ('shut' as const) },
        })),
      }
    : {};

/** A flued appliance that is told of leads with its caution, ticked or not. */
const circumstancesOf = ({ circumstances = [], appliances = [] }: RoomBalanceQuestion) =>
  appliances.length > 0 ? [...circumstances, 'flued-appliance' as const] : circumstances;
