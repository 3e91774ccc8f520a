import { ROOM_AIR } from '../../lib/air/air-density.ts';
import { solveNetwork } from '../../lib/air/branch-network.ts';
import { systemPressure } from '../../lib/air/system-pressure.ts';
import { fanExhaust } from '../../lib/air/exhaust.ts';
import { fanOf } from '../../lib/air/fan-curve.ts';
import { leakageOfArea } from '../../lib/air/leakage.ts';
import { meetingOf } from '../../lib/air/operating-point.ts';
import { balanceRoom } from '../../lib/air/room-balance.ts';

const fan = fanOf([
  { airflow: 0, staticPressure: 900 },
  { airflow: 0.1, staticPressure: 800 },
  { airflow: 0.25, staticPressure: 500 },
  { airflow: 0.4, staticPressure: 0 },
]);
const fittings = (/** @type {number} */ count) =>
  Array.from({ length: count }, () => ({ fitting: 'elbow-90-r1.5', count: 1 }));
const system = (/** @type {number} */ count, length = 8) => ({
  entryLossFactor: 0.5,
  runs: [{ duct: 'galvanised-steel', diameter: 0.15, length, fittings: fittings(count) }],
});
const network = (/** @type {number} */ count) => ({
  branches: Array.from({ length: count }, (_, i) => ({ name: `${i}`, open: true, system: system(2, 2 + i) })),
  main: { ...system(2), entryLossFactor: 0 },
  ...{ fan, air: ROOM_AIR },
});
const room = (/** @type {number} */ exhausts, /** @type {number} */ openings) => ({
  ...{ indoor: 1.2041, outdoor: 1.29, supply: 0.05, leakage: leakageOfArea(0.02), height: 2.6 },
  exhausts: Array.from({ length: exhausts }, (_, i) => fanExhaust(`${i}`, fan, system(2, 2 + i), ROOM_AIR)),
  openings: Array.from({ length: openings }, (_, i) => ({ area: 0.02, height: i / 2 })),
});

/** The same loss of a 12-fitting duct by hand: one loop, no types, no parts, the same Colebrook to the same digits. */
function byHand(/** @type {number} */ q) {
  const [d, l, rough, rho, mu] = [0.15, 8, 0.00009, ROOM_AIR.density, ROOM_AIR.viscosity];
  const v = q / ((Math.PI * d * d) / 4);
  const pv = (rho * v * v) / 2;
  const re = (rho * v * d) / mu;
  let x = -1.8 * Math.log10((rough / d / 3.7) ** 1.11 + 6.9 / re);
  for (let i = 0; i < 60; i += 1) {
    const inside = rough / d / 3.7 + (2.51 * x) / re;
    const residual = x + 2 * Math.log10(inside);
    if (Math.abs(residual) <= 1e-13 * Math.max(1, x)) break;
    x -= residual / (1 + 5.02 / (re * inside * Math.LN10));
  }
  return 1.5 * pv + (l / d / (x * x)) * pv + 12 * 0.15 * pv;
}

/** What was worked out last: kept, so that nothing is left out as unused. */
export let kept;

/** Runs a second. */
function perSecond(/** @type {() => unknown} */ work, least = 400) {
  for (let i = 0; i < 3; i += 1) work();
  const begun = performance.now();
  let runs = 0;
  while (performance.now() - begun < least)
    for (let i = 0; i < 16; i += 1) {
      kept = work();
      runs += 1;
    }
  return (runs * 1000) / (performance.now() - begun);
}

/** Each sum's speed at two sizes; `growth` is how many times longer the larger one takes for each time it is larger. */
export function airSpeed() {
  let q = 0.1;
  const next = () => (q = q > 0.2 ? 0.1 : q + 1e-6);
  const duct = (/** @type {number} */ count) => {
    const lossAt = systemPressure(system(count), ROOM_AIR);
    return perSecond(() => lossAt(next()));
  };
  const meeting = (/** @type {number} */ count) => {
    const made = system(count);
    return perSecond(() => meetingOf(fan, systemPressure(made, ROOM_AIR)));
  };
  const branches = (/** @type {number} */ count) => {
    const made = network(count);
    return perSecond(() => solveNetwork(made));
  };
  const balance = (/** @type {number} */ exhausts, /** @type {number} */ openings) => {
    const made = room(exhausts, openings);
    return perSecond(() => balanceRoom(made));
  };
  const hand = perSecond(() => byHand(next()));
  const twelve = duct(12);
  const rows = [
    { name: 'duct of 12 fittings', speed: twelve, growth: twelve / duct(48) / 4 },
    { name: 'operating point on it', speed: meeting(12), growth: meeting(12) / meeting(48) / 4 },
    { name: 'five branches on one fan', speed: branches(5), growth: branches(5) / branches(20) / 4 },
    { name: 'room of 20 exhausts and 6 openings', speed: balance(20, 6), growth: balance(5, 2) / balance(20, 6) / 4 },
  ];
  return { rows, ratio: hand / twelve };
}
