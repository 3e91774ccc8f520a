import { STANDARD_GRAVITY } from '@/lib/units/factors';
import type { CubicMetresPerSecond, KilogramsPerCubicMetre, Metres, Pascals, SquareMetres } from '@/lib/units/quantity';
import { UNKNOWN_REACH, type Exhaust } from './exhaust';
import { findRoot } from './find-root';
import { leakageAirflow, type Leakage } from './leakage';
import { orificeAirflow } from './orifice';

/** A way in that is open. `height` of its middle above the floor, m: 0 unless told. */
export type Opening = { area: SquareMetres; coefficient?: number; height?: Metres };

/**
 * A room by all that moves its air. `supply` is blown in, m3/s of outdoor air. `height` of the room spreads its cracks over a quarter
 * and three quarters of it; without one they are at the floor.
 */
export type Room = {
  indoor: KilogramsPerCubicMetre;
  outdoor: KilogramsPerCubicMetre;
  exhausts: readonly Exhaust[];
  supply: CubicMetresPerSecond;
  openings: readonly Opening[];
  leakage?: Leakage;
  height?: Metres;
};

/** All airflows in m3/s at the room's density, in is positive; `residual` kg/s that the balance is off by, `largest` kg/s of
 * the largest flow in it: air may come in below and go out above.
 */
export type Balance = {
  pressure: Pascals;
  exhausts: { name: string; airflow: CubicMetresPerSecond; wanted: CubicMetresPerSecond }[];
  supply: CubicMetresPerSecond;
  openings: CubicMetresPerSecond;
  leakage: CubicMetresPerSecond;
  residual: number;
  largest: number;
};

/** A supply fan of unknown curve gives way as a stated exhaust does. */
const suppliedAt = (supply: number, pressure: number) =>
  supply * Math.min(1, Math.max(0, (UNKNOWN_REACH - pressure) / (0.1 * UNKNOWN_REACH)));

/** Mass through one way, kg/s: outdoor air comes in where the room is below outdoors at that height, the room's own goes out. */
function massThrough(room: Room, volume: (difference: number, density: KilogramsPerCubicMetre) => number) {
  return (pressure: number, height: number) => {
    const difference = -(pressure + STANDARD_GRAVITY * (room.outdoor - room.indoor) * height);
    const density = difference > 0 ? room.outdoor : room.indoor;
    return density * volume(difference, density);
  };
}

/** Mass that each kind of way lets in at a pressure, kg/s. */
function inflows(room: Room) {
  const { openings, leakage, height, supply, outdoor } = room;
  const ways = openings.map(({ area, coefficient, height: at = 0 }) => {
    const through = massThrough(room, (difference, density) => orificeAirflow(area, difference, density, coefficient));
    return (pressure: number) => through(pressure, at);
  });
  const cracks = massThrough(room, (difference) => (leakage ? leakageAirflow(leakage, difference) : 0));
  const levels = height ? [height / 4, (3 * height) / 4] : [0];
  const mean = (pressure: number) => levels.reduce((sum, level) => sum + cracks(pressure, level), 0) / levels.length;
  return {
    supply: (pressure: number) => outdoor * suppliedAt(supply, pressure),
    openings: (pressure: number) => ways.reduce((sum, way) => sum + way(pressure), 0),
    leakage: (pressure: number) => (leakage ? mean(pressure) : 0),
    largest: (pressure: number) => Math.max(0, ...ways.map((way) => Math.abs(way(pressure)))),
  };
}

/** All that is let in at a pressure, m3/s at the room's density; negative where more goes out by the ways in. */
export function letInAt(room: Room, pressure: number): CubicMetresPerSecond {
  const into = inflows(room);
  const mass = into.supply(pressure) + into.openings(pressure) + into.leakage(pressure);
  return (mass / room.indoor) as CubicMetresPerSecond;
}

/**
 * The pressure of a room, Pa against outdoors at the floor, at which what leaves it equals what is let in, by mass. All exhausts,
 * the supply, the openings and the cracks are solved together: one function that falls as the pressure rises, so one root, between two
 * pressures that no fan in it can pass. What leaves is never more than what is let in.
 * Source: mass balance; ASHRAE Fundamentals (2021), ch. 16.
 */
export function balanceRoom(room: Room): Balance {
  const into = inflows(room);
  const given = (pressure: number) => into.supply(pressure) + into.openings(pressure) + into.leakage(pressure);
  const taken = (pressure: number) =>
    room.indoor * room.exhausts.reduce((sum: number, exhaust) => sum + exhaust.airflowAt(pressure), 0);
  const excess = (pressure: number) => given(pressure) - taken(pressure);
  const cracked = room.leakage ? (room.height ?? 0) : 0;
  const tallest = room.openings.reduce((most, { height = 0 }) => Math.max(most, height), cracked);
  const stack = Math.abs(STANDARD_GRAVITY * (room.outdoor - room.indoor) * tallest);
  const reach = room.exhausts.reduce((most: number, exhaust) => Math.max(most, exhaust.reach), UNKNOWN_REACH) + stack;
  const pressure = excess(0) === 0 ? 0 : findRoot(excess, -reach, reach);
  const volume = (mass: number) => (mass / room.indoor) as CubicMetresPerSecond;
  return {
    pressure: pressure as Pascals,
    exhausts: room.exhausts.map(({ name, wanted, airflowAt }) => ({
      ...{ name, wanted, airflow: airflowAt(pressure) as CubicMetresPerSecond },
    })),
    supply: volume(into.supply(pressure)),
    openings: volume(into.openings(pressure)),
    leakage: volume(into.leakage(pressure)),
    residual: excess(pressure),
    largest: Math.max(into.largest(pressure), Math.abs(taken(pressure)), into.supply(pressure)),
  };
}
