import { airflowOf, type HoodName } from '@/lib/air/hood-airflow';
import { timeUntil } from '@/lib/air/decay';
import { cubicMetres, cubicMetresPerSecond, metres, metresPerSecond } from '@/lib/units/quantity';
import { hoodOf } from '@/lib/worksheets/hood-airflow/hood';
import { FIELDS_OF } from '@/lib/worksheets/hood-airflow/fields';
import { hoodAirflowRequest } from '@/lib/worksheets/hood-airflow/schema';
import type { RoomBalanceQuestion, RoomBalanceResult } from '@/lib/worksheets/room-balance/schema';
import { solveRoomBalance } from '@/lib/worksheets/room-balance/solve';
import type { Plan, PlanExhaust, PlanRoom, PlanStation } from './plan-schema';
import { exhaustNamed, roomNamed, roomQuestion } from './room-question';

/** What a pair asks of a station: its control, and the velocity at the source, m/s, where one is stated. */
export type Need = {
  control: 'general ventilation' | 'local exhaust' | 'enclosed exhaust' | 'prohibited' | 'unknown';
  velocity?: { min: number; max: number };
};

/** All airflows m3/s. `share` is delivered over needed. */
export type Measured = {
  needed: number;
  delivered: number;
  alone: number;
  share: number;
  roomPressure: number;
  spills: string[];
  clearing: number;
  assumptions: string[];
};
export type Coped =
  | { verdict: 'prohibited'; why: string }
  | { verdict: 'unknown'; why: string }
  | { verdict: 'cannot be judged'; why: string[] }
  | ({ verdict: 'meets' | 'falls short' } & Measured);

/** To what share of the air a room is cleared in the time told, and with what mixing: common practice, no source. */
const CLEARED = 0.01;
const MIXING = 3;
const ENCLOSURE: readonly HoodName[] = ['enclosure'];

/** The airflow this station's own hood needs for a velocity, m3/s, or what its description lacks. */
export function neededAirflow(station: PlanStation, velocity: number): { airflow: number } | { lacks: string[] } {
  const { hood, distance, diameter, width, height, openArea, perimeter } = station;
  if (!hood) return { lacks: [`What hood ${station.name ?? 'the station'} has is missing.`] };
  const sizes = Object.entries({ distance, diameter, width, height, openArea, perimeter }).filter(
    ([field, value]) => value !== undefined && (FIELDS_OF[hood] as readonly string[]).includes(field),
  );
  const admitted = hoodAirflowRequest.safeParse({ hood, velocity, ...Object.fromEntries(sizes) });
  if (!admitted.success)
    return {
      lacks: admitted.error.issues.map(
        ({ path, message }) => `Hood of ${station.name ?? 'the station'}: ${path.join('.')} ${message}.`,
      ),
    };
  return { airflow: airflowOf(hoodOf(admitted.data), metresPerSecond(velocity), metres(distance ?? 0)) };
}

function stopped(station: PlanStation, { control, velocity }: Need): Coped | undefined {
  if (control === 'prohibited') return { verdict: 'prohibited', why: 'No airflow makes a prohibited pair acceptable.' };
  if (control === 'unknown')
    return { verdict: 'unknown', why: 'What is not identified is not run, whatever the airflow.' };
  if (control === 'general ventilation')
    return {
      verdict: 'cannot be judged',
      why: [
        'General ventilation is judged by what is given off and not by a hood: reckon it with the dilution worksheet.',
      ],
    };
  if (control === 'enclosed exhaust' && station.hood && !ENCLOSURE.includes(station.hood))
    return {
      verdict: 'cannot be judged',
      why: [
        'This pair needs an enclosure under suction. The hood of this station is open, and no airflow makes it one.',
      ],
    };
  if (!velocity)
    return {
      verdict: 'cannot be judged',
      why: ['No capture velocity is stated for this pair, so there is nothing to hold the airflow against.'],
    };
  return undefined;
}

/** What a station gets of its exhaust, m3/s: its own branch where it has one, or all of it. */
function shareOf({ exhausts }: RoomBalanceResult, name: string, station: PlanStation): number {
  const exhaust = exhausts.find((each) => each.name === name);
  const branch = exhaust?.branches?.find((each) => each.name === station.name);
  return branch?.airflow ?? exhaust?.airflow ?? 0;
}

/** Rooms solved with everything on, by the plan they are in: all stations of a room ask for the same. */
const solved = new WeakMap<Plan, Map<PlanRoom, RoomBalanceResult>>();

function everythingOn(plan: Plan, room: PlanRoom, question: RoomBalanceQuestion): RoomBalanceResult {
  const rooms = solved.get(plan) ?? new Map<PlanRoom, RoomBalanceResult>();
  solved.set(plan, rooms);
  const held = rooms.get(room) ?? solveRoomBalance(question).result;
  rooms.set(room, held);
  return held;
}

/** What a station is delivered, whatever pair is asked of it; or what its description lacks. */
export type Delivered = Omit<Measured, 'needed' | 'share'> | { lacks: string[] };

/** What the exhaust of a station delivers there with everything in its room on, and with it alone, all solved together. */
export function deliver(plan: Plan, station: PlanStation): Delivered {
  const exhaust = exhaustNamed(plan, station.exhaust);
  if (!exhaust) return { lacks: [`${station.name ?? 'The station'} is at no exhaust that is described.`] };
  const room = roomNamed(plan, exhaust.room);
  if (!room) return { lacks: [`The room of ${exhaust.name ?? 'the exhaust'} is not described.`] };
  const isIts = (each: PlanExhaust) => each === exhaust;
  const [all, alone] = [roomQuestion(plan, room), roomQuestion(plan, room, isIts, (each) => each === station)];
  const name = alone.value?.exhausts[0]?.name;
  if (!all.value || !alone.value || name === undefined)
    return { lacks: [...alone.gaps, ...(all.value ? [] : all.gaps)] };
  const [together, by] = [everythingOn(plan, room, all.value), solveRoomBalance(alone.value).result];
  const leaves = together.exhausts.reduce((sum, { airflow }) => sum + Math.max(0, airflow), 0);
  return {
    ...{ delivered: shareOf(together, name, station), alone: shareOf(by, name, station) },
    roomPressure: together.roomPressure,
    spills: together.appliances.filter(({ spills }) => spills).map((appliance) => appliance.name),
    clearing:
      leaves > 0 ? timeUntil(CLEARED, cubicMetresPerSecond(leaves), cubicMetres(room.volume!), MIXING) : Infinity,
    assumptions: [...new Set([...all.assumptions, ...all.gaps])],
  };
}

/**
 * Whether a station of a workshop has the air that a pair needs: its own hood's need at the highest stated velocity, against what it is
 * delivered. @param delivers what `deliver` gives, worked out once where many pairs are asked
 * @returns prohibited stays prohibited; what is missing is told
 */
export function cope(plan: Plan, station: PlanStation, need: Need, delivers = () => deliver(plan, station)): Coped {
  const before = stopped(station, need);
  if (before) return before;
  const needed = neededAirflow(station, need.velocity!.max);
  const given = delivers();
  if ('lacks' in needed || 'lacks' in given)
    return { verdict: 'cannot be judged', why: [needed, given].flatMap((each) => ('lacks' in each ? each.lacks : [])) };
  const share = given.delivered / needed.airflow;
  return { verdict: share >= 1 ? 'meets' : 'falls short', ...given, needed: needed.airflow, share };
}
