import type { RoomBalanceQuestion } from '@/lib/worksheets/room-balance/schema';
import type { Plan, PlanExhaust, PlanRoom, PlanStation } from './plan-schema';

/** What is taken where a workshop does not say: trade defaults without a source, each told with the answer. */
export const ASSUMED = {
  indoor: 20,
  outdoor: 0,
  ach50: 6,
  entryLossFactor: {
    'plain-opening': 0.93,
    'flanged-opening': 0.49,
    'bench-opening': 0.49,
    'plain-slot': 1.78,
    'flanged-slot': 1.78,
    enclosure: 0.5,
    canopy: 0.25,
  },
} as const;

type Asked = RoomBalanceQuestion['exhausts'][number];
/** What is lacking is told by `gaps`, what was assumed by `assumptions`, in sentences. */
export type Ready<T> = { value?: T; gaps: string[]; assumptions: string[] };

const entryOf = ({ entryLossFactor }: PlanExhaust, station?: PlanStation) =>
  entryLossFactor ?? ASSUMED.entryLossFactor[station?.hood ?? 'plain-opening'];

/** The stations of an exhaust that have a duct of their own: machines on one fan. `open` tells whose gate is. */
const branchesOf = (exhaust: PlanExhaust, stations: readonly PlanStation[], open: (station: PlanStation) => boolean) =>
  stations.flatMap((station) =>
    station.runs && station.name
      ? [
          {
            ...{ name: station.name, runs: station.runs, hood: { entryLossFactor: entryOf(exhaust, station) } },
            gate: open(station) ? ('open' as const) : ('shut' as const),
          },
        ]
      : [],
  );

/** An exhaust with its stations as the room worksheet asks for it; its filter is taken as loaded where that is known. */
export function exhaustOf(
  exhaust: PlanExhaust,
  stations: readonly PlanStation[] = [],
  open: (station: PlanStation) => boolean = () => true,
): Ready<Asked> {
  const { airflow, fan, runs, filter, outletLossFactor, name = 'the exhaust' } = exhaust;
  const assumptions: string[] = [];
  if (airflow !== undefined && !fan) {
    assumptions.push(`${name} is taken to hold its stated airflow, which few do: give its curve and duct.`);
    return { value: { name, airflow }, gaps: [], assumptions };
  }
  if (!fan || !runs) return { gaps: [`${name} has no airflow, and no fan curve with its duct.`], assumptions };
  const branches = branchesOf(exhaust, stations, open);
  if (exhaust.entryLossFactor === undefined)
    assumptions.push(
      `The hood of ${name} is taken to lose ${entryOf(exhaust, stations[0])} velocity pressures on entry.`,
    );
  if (filter?.loaded !== undefined) assumptions.push(`The filter of ${name} is taken as loaded.`);
  if (branches.length > 1) assumptions.push(`All gates of ${name} are taken as open where everything is on.`);
  const full = filter?.clean !== undefined && filter.at !== undefined;
  return {
    value: {
      ...{ name, fan, runs },
      ...(branches.length > 0 ? { branches } : { hood: { entryLossFactor: entryOf(exhaust, stations[0]) } }),
      ...(full ? { filter: { clean: filter.loaded ?? filter.clean!, at: filter.at! } } : {}),
      ...(outletLossFactor === undefined ? {} : { outlet: { k: outletLossFactor } }),
    },
    ...{ gaps: [], assumptions },
  };
}

const same = (a = '', b = '') => a.trim().toLowerCase() === b.trim().toLowerCase();

/** The exhaust of a station and the room of an exhaust, by the names that were written. */
export const exhaustNamed = ({ exhausts = [] }: Plan, name?: string) =>
  exhausts.find((each) => name && same(each.name, name));
export const roomNamed = ({ rooms = [] }: Plan, name?: string) =>
  rooms.find((each) => name && same(each.name, name)) ?? (rooms.length === 1 ? rooms[0] : undefined);
export const stationNamed = ({ stations = [] }: Plan, name: string) => stations.find((each) => same(each.name, name));
const stationsAt = ({ stations = [] }: Plan, exhaust: PlanExhaust) =>
  stations.filter((each) => each.exhaust && same(each.exhaust, exhaust.name));
export const exhaustsOf = (plan: Plan, room: PlanRoom) =>
  (plan.exhausts ?? []).filter((each) => roomNamed(plan, each.room) === room);

function makeUpOf({ supply, openings = [], ach50 }: PlanRoom): RoomBalanceQuestion['makeUp'] {
  return {
    ...(supply === undefined ? {} : { supply }),
    openings: openings.flatMap(({ area, height }) =>
      area === undefined ? [] : [{ area, ...(height === undefined ? {} : { height }) }],
    ),
    leakage: { ach50: ach50 ?? ASSUMED.ach50 },
  };
}

/** One room as the room worksheet asks for it, with all its exhausts that are known, or those of them that `counts`. */
export function roomQuestion(
  plan: Plan,
  room: PlanRoom,
  counts: (exhaust: PlanExhaust) => boolean = () => true,
  open: (station: PlanStation) => boolean = () => true,
): Ready<RoomBalanceQuestion> {
  const { climate = {} } = plan;
  const title = room.name ?? 'the room';
  if (room.volume === undefined) return { gaps: [`The volume of ${title} is missing.`], assumptions: [] };
  const exhausts = exhaustsOf(plan, room)
    .filter(counts)
    .map((each) => exhaustOf(each, stationsAt(plan, each), open));
  const assumptions = exhausts.flatMap((each) => each.assumptions);
  if (climate.indoor === undefined || climate.outdoor === undefined)
    assumptions.push(
      `It is taken to be ${climate.indoor ?? ASSUMED.indoor} °C indoors and ${climate.outdoor ?? ASSUMED.outdoor} °C outdoors.`,
    );
  if (room.ach50 === undefined)
    assumptions.push(`${title} is taken to leak ${ASSUMED.ach50} air changes an hour at 50 Pa.`);
  const appliances = (room.appliances ?? []).flatMap(({ vent, name, ...rest }) =>
    vent ? [{ ...rest, vent, name: name ?? 'appliance' }] : [],
  );
  return {
    value: {
      room: { volume: room.volume, ...(room.height === undefined ? {} : { height: room.height }) },
      air: {
        ...{ indoor: climate.indoor ?? ASSUMED.indoor, outdoor: climate.outdoor ?? ASSUMED.outdoor },
        ...(climate.altitude === undefined ? {} : { altitude: climate.altitude }),
      },
      exhausts: exhausts.flatMap(({ value }) => value ?? []),
      makeUp: makeUpOf(room),
      appliances,
    },
    gaps: exhausts.flatMap((each) => each.gaps),
    assumptions,
  };
}
