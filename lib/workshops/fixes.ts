import { DUCT_KINDS } from '@/lib/air/duct-kind';
import { cope, type Coped, type Need } from './cope';
import type { Plan, PlanExhaust, PlanRoom, PlanStation } from './plan-schema';
import { exhaustNamed, roomNamed } from './room-question';

/** Something that could be changed, and the share of the needed air that the station would then have. */
export type Fix = { code: string; part: string; text: string; share: number };

type Change = {
  code: string;
  part: string;
  text: string;
  exhaust?: (exhaust: PlanExhaust) => PlanExhaust | undefined;
  station?: (station: PlanStation) => PlanStation | undefined;
  room?: (room: PlanRoom) => PlanRoom | undefined;
};

const WIDER = 1.25;
type Runs = NonNullable<PlanExhaust['runs']>;
const withRuns = (change: (runs: Runs) => Runs) => (exhaust: PlanExhaust) =>
  exhaust.fan && exhaust.runs ? { ...exhaust, runs: change(exhaust.runs) } : undefined;

/** What a keeper can do, each as a change of the description that is then solved again. */
const CHANGES: readonly Change[] = [
  {
    ...{ code: 'hose', part: 'slack hose', text: 'Replace the hose by pipe, or pull it straight.' },
    exhaust: (exhaust) =>
      exhaust.runs?.some(({ duct }) => DUCT_KINDS[duct].flexible)
        ? withRuns((runs) =>
            runs.map((run) =>
              DUCT_KINDS[run.duct].flexible
                ? { ...run, duct: 'galvanised-steel' as const, compression: undefined }
                : run,
            ),
          )(exhaust)
        : undefined,
  },
  {
    ...{ code: 'duct', part: 'narrow duct', text: 'Lay the duct a quarter wider.' },
    exhaust: withRuns((runs) => runs.map((run) => ({ ...run, diameter: run.diameter * WIDER }))),
  },
  {
    ...{ code: 'filter', part: 'loaded filter', text: 'Change the filter.' },
    exhaust: ({ filter, ...exhaust }) =>
      filter?.loaded !== undefined && filter.clean !== undefined && filter.loaded > filter.clean
        ? { ...exhaust, filter: { ...filter, loaded: filter.clean } }
        : undefined,
  },
  {
    ...{ code: 'speed', part: 'throttled fan', text: 'Run the fan at its full speed.' },
    exhaust: (exhaust) =>
      exhaust.fan && (exhaust.fan.speed ?? 1) < 1 ? { ...exhaust, fan: { ...exhaust.fan, speed: 1 } } : undefined,
  },
  {
    ...{
      code: 'make-up',
      part: 'too little make-up air',
      text: 'Let more air in: an opening of half a square metre to outdoors.',
    },
    room: (room) => ({ ...room, openings: [...(room.openings ?? []), { area: 0.5 }] }),
  },
  {
    ...{ code: 'nearer', part: 'hood too far away', text: 'Bring the hood to half the distance.' },
    station: (station) =>
      station.distance && station.hood !== 'enclosure' ? { ...station, distance: station.distance / 2 } : undefined,
  },
  {
    ...{ code: 'flange', part: 'hood without a rim', text: 'Put a flat rim round the hood.' },
    station: (station) =>
      station.hood === 'plain-opening'
        ? { ...station, hood: 'flanged-opening' }
        : station.hood === 'plain-slot'
          ? { ...station, hood: 'flanged-slot' }
          : undefined,
  },
  {
    ...{ code: 'gaps', part: 'gaps of the enclosure', text: 'Close half of the gaps of the enclosure.' },
    station: (station) =>
      station.hood === 'enclosure' && station.openArea ? { ...station, openArea: station.openArea / 2 } : undefined,
  },
];

const put = <T>(list: readonly T[] = [], from: T | undefined, to: T) => list.map((each) => (each === from ? to : each));

/** The workshop and station after a change; undefined where there is nothing to change. */
function changed(plan: Plan, station: PlanStation, change: Change): { plan: Plan; station: PlanStation } | undefined {
  const exhaust = exhaustNamed(plan, station.exhaust);
  const room = exhaust && roomNamed(plan, exhaust.room);
  if (change.station) {
    const to = change.station(station);
    return to && { plan: { ...plan, stations: put(plan.stations, station, to) }, station: to };
  }
  if (change.room && room) {
    const to = change.room(room);
    return to && { plan: { ...plan, rooms: put(plan.rooms, room, to) }, station };
  }
  const to = exhaust && change.exhaust?.(exhaust);
  return to && { plan: { ...plan, exhausts: put(plan.exhausts, exhaust, to) }, station };
}

/** A change that adds less than this to the share is not worth telling: common practice, no source. */
const WORTH = 0.01;

/**
 * What would change a station's air the most, by solving again with each change, the best first. The first one's `part` is what limits
 * it most. None for a station that cannot be judged.
 */
export function fixesFor(plan: Plan, station: PlanStation, need: Need, now: Coped): Fix[] {
  if (!('share' in now)) return [];
  return CHANGES.flatMap((change) => {
    const after = changed(plan, station, change);
    const then = after && cope(after.plan, after.station, need);
    if (!then || !('share' in then) || then.share < now.share + WORTH) return [];
    return [{ code: change.code, part: change.part, text: change.text, share: then.share }];
  }).sort((a, b) => b.share - a.share);
}
