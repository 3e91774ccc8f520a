import { describe, expect, it } from 'vitest';
import { ROOM_AIR } from '@/lib/air/air-density';
import { fanDutyRequest } from '@/lib/worksheets/fan-duty/schema';
import { solveFanDuty } from '@/lib/worksheets/fan-duty/solve';

/** A shop’s own fan, in Pa and m3/h. */
const curve = [
  [340, 0],
  [300, 200],
  [200, 480],
  [100, 700],
  [0, 900],
].map(([staticPressure, flow]) => ({ staticPressure, airflow: flow! / 3600 }));
/** A system that loses `pressure` Pa at 500 m3/h and goes with the square of the airflow: a short wide end with one fitting. */
function losing(pressure: number) {
  const velocity = 500 / 3600 / ((Math.PI * 0.15 ** 2) / 4);
  const k = pressure / ((ROOM_AIR.density * velocity ** 2) / 2) - 1;
  return {
    hood: { entryLossFactor: 0 },
    runs: [{ duct: 'smooth-plastic', diameter: 0.15, length: 0, fittings: [{ fitting: 'all of it', count: 1, k }] }],
  };
}
const solve = (question: object) => {
  const answer = solveFanDuty(fanDutyRequest.parse(question));
  if (!answer.ok) throw new Error(answer.detail);
  return answer.value;
};
const codes = (question: object) => solve(question).warnings.map(({ code }) => code);
const machine = (name: string, length: number, more: object = {}) => ({
  ...{ name, hood: { entryLossFactor: 0.5 }, runs: [{ duct: 'galvanised-steel', diameter: 0.1, length }] },
  ...more,
});

describe('the fan worksheet', () => {
  // Read off by eye in the shop’s question: about 500 m3/h at 190 Pa, then about 355 m3/h at 245 Pa. 5 %.
  it.each([
    [190, 500, 190],
    [484, 355, 245],
  ])('meets a hand reading on a system of %s Pa at 500 m³/h', (pressure, flow, at) => {
    const { result } = solve({ fan: { curve }, ...losing(pressure) });
    expect(Math.abs((result.airflow * 3600) / flow - 1)).toBeLessThan(0.05);
    expect(Math.abs(result.staticPressure / at - 1)).toBeLessThan(0.05);
  });

  it('gives the speed that then moves the airflow wanted, and says that a setting is no speed', () => {
    const wanted = { fan: { curve }, ...losing(190), targetAirflow: 0.1 };
    const { result } = solve(wanted);
    const slowed = solve({ ...wanted, fan: { curve, speed: result.speedForAirflow } }).result;
    expect(slowed.airflow).toBeCloseTo(0.1, 6);
    expect(codes(wanted)).toContain('duty-is-not-speed');
    expect(codes({ ...wanted, targetAirflow: 0.3 })).toContain('too-weak');
  });

  it('moves less against a room that is drawn down, and less still with its filter loaded', () => {
    const open = solve({ fan: { curve }, ...losing(190) }).result.airflow;
    expect(solve({ fan: { curve }, ...losing(190), roomPressure: -30 }).result.airflow).toBeLessThan(open);
    const { airflow, loadedFilter } = solve({
      fan: { curve },
      ...losing(190),
      filter: { clean: 30, loaded: 120, at: 0.1 },
    }).result;
    expect(airflow).toBeLessThan(open);
    expect(loadedFilter!.airflow).toBeLessThan(airflow);
  });

  it('refuses a fan that the room outpulls at every airflow', () => {
    const answer = solveFanDuty(fanDutyRequest.parse({ fan: { curve }, ...losing(190), roomPressure: -400 }));
    expect(answer).toMatchObject({ ok: false, status: 422, errors: [{ path: 'fan.curve' }] });
  });

  it('says so where the curve ends first, has a hump, or is used left of its peak', () => {
    expect(codes({ fan: { curve: curve.slice(0, 3) }, ...losing(45) })).toContain('beyond-curve');
    const hump = [
      [0, 300],
      [0.1, 150],
      [0.2, 260],
      [0.3, 0],
    ].map(([airflow, staticPressure]) => ({ airflow, staticPressure }));
    expect(
      codes({
        fan: { curve: hump },
        hood: { entryLossFactor: 0 },
        runs: [{ duct: 'smooth-plastic', diameter: 0.5, length: 0 }],
        roomPressure: -200,
      }),
    ).toContain('several-meetings');
    const peaked = [
      [0, 200],
      [0.1, 250],
      [0.2, 0],
    ].map(([airflow, staticPressure]) => ({ airflow, staticPressure }));
    expect(codes({ fan: { curve: peaked }, ...losing(3000) })).toContain('stall');
  });

  it('divides one fan among machines, names the one that starves, and says what a gate must add', () => {
    const shop = {
      fan: { curve },
      ...losing(60),
      branches: [
        machine('near', 1, { wanted: 0.09 }),
        machine('far', 25, { wanted: 0.09 }),
        machine('idle', 3, { gate: 'shut' }),
      ],
    };
    const { result, warnings } = solve(shop);
    const [near, far, idle] = result.branches!;
    expect(near!.airflow).toBeGreaterThan(far!.airflow);
    expect(idle!.airflow).toBeLessThan(0.1 * near!.airflow);
    expect(result.branches!.reduce((sum, { airflow }) => sum + airflow, 0)).toBeCloseTo(result.airflow, 12);
    expect(near!.balancingLossFactor).toBeGreaterThan(0);
    expect(far!.balancingLossFactor).toBe(0);
    expect(warnings.find(({ code }) => code === 'starves')?.text).toMatch(/^far gets/);
  });

  it('says where air comes back out of an idle hood: from a fan that is off, into a room that is drawn down', () => {
    const off = {
      fan: { curve, speed: 0 },
      ...losing(60),
      branches: [machine('here', 3, { roomPressure: -10 }), machine('there', 3)],
    };
    const { result, warnings } = solve(off);
    expect(result.branches![0]!.airflow).toBeLessThan(0);
    expect(warnings.map(({ code }) => code)).toContain('comes-back');
  });

  it.each([
    ['one point', [{ airflow: 0, staticPressure: 100 }], ['fan', 'curve']],
    [
      'points that go back',
      [
        { airflow: 0.1, staticPressure: 100 },
        { airflow: 0.1, staticPressure: 50 },
      ],
      ['fan', 'curve', 1, 'airflow'],
    ],
    [
      'a fan without pressure',
      [
        { airflow: 0, staticPressure: 0 },
        { airflow: 0.1, staticPressure: -5 },
      ],
      ['fan', 'curve'],
    ],
  ])('refuses %s', (_, points, path) =>
    expect(fanDutyRequest.safeParse({ fan: { curve: points }, ...losing(100) }).error?.issues[0]?.path).toEqual(path),
  );
});
