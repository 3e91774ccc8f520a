import { describe, expect, it } from 'vitest';
import { roomBalanceRequest } from '@/lib/worksheets/room-balance/schema';
import { solveRoomBalance } from '@/lib/worksheets/room-balance/solve';

const solve = (question: object) =>
  solveRoomBalance(
    roomBalanceRequest.parse({
      ...{ room: { volume: 100 }, air: { indoor: 20, outdoor: 20 }, exhausts: [], makeUp: { leakage: { ach50: 5 } } },
      ...question,
    }),
  );
const heater = (more: object = {}) => ({ name: 'water heater', vent: 'natural-draught', ...more });
const textOf = (question: object, code: string) =>
  solve(question).warnings.find((warning) => warning.code === code)?.text;
/** Of 100 m3 at 5 changes an hour at 50 Pa, the exhaust that draws the room down so far: Q = Q50 (Δp / 50)^0.65. */
const drawing = (pressure: number) => [{ name: 'fan', airflow: (500 / 3600) * (pressure / 50) ** 0.65 }];

describe('a flue against its room', () => {
  it('that is colder than outdoors pulls down, so that it spills with nothing on and no opening helps', () => {
    const summer = { air: { indoor: 20, outdoor: 32 }, appliances: [heater({ flueHeight: 6 })] };
    const { result } = solve(summer);
    // By hand: g H (ρ at 32 °C − ρ at 20 °C) = 9.80665 × 6 × (1.1567 − 1.2041) = −2.79 Pa.
    expect(result.appliances[0]!.draught).toBeCloseTo(-2.79, 1);
    expect(result.appliances[0]).toMatchObject({ spills: true, beyondLimit: false });
    expect(textOf(summer, 'flue-spills')).toMatch(/pulls 2\.79.* down.*No opening makes this flue draw/);
  });

  it('that is held up by a room above outdoors does not spill, and one that is not does, said to be above', () => {
    const at = (supply: number) => ({
      air: { indoor: 20, outdoor: 32 },
      makeUp: { supply, leakage: { ach50: 5 } },
      appliances: [heater({ flueHeight: 6 })],
    });
    expect(solve(at(0.08)).result.appliances[0]!.spills).toBe(false);
    expect(solve(at(0.01)).result.roomPressure).toBeGreaterThan(0);
    expect(textOf(at(0.01), 'flue-spills')).toMatch(/above outdoors/);
  });

  it('is beaten before its limit where its draught is less, and beyond its limit where it is more', () => {
    // 3 m at 30 °C in air of 20 °C pulls 9.80665 × 3 × 1.2041 × (1 − 293.15 / 303.15) = 1.17 Pa.
    const weak = heater({ flueHeight: 3, flueTemperature: 30 });
    const at = (pressure: number, appliance: object) =>
      solve({ exhausts: drawing(pressure), appliances: [appliance] }).result.appliances[0];
    expect(at(1.1, weak)).toMatchObject({ spills: false, beyondLimit: false });
    expect(at(1.3, weak)).toMatchObject({ spills: true, beyondLimit: false });
    const strong = heater({ flueHeight: 6, flueTemperature: 150 });
    expect(at(2.1, strong)).toMatchObject({ spills: true, beyondLimit: true });
  });

  it('that is weak needs an opening that holds the room at its draught and not at its limit', () => {
    const question = { exhausts: drawing(1.5), appliances: [heater({ flueHeight: 3, flueTemperature: 30 })] };
    const { openingNeeded, appliances } = solve(question).result;
    const opened = (area: number) =>
      solve({ ...question, makeUp: { leakage: { ach50: 5 }, openings: [{ area }] } }).result;
    expect(opened(openingNeeded!).roomPressure).toBeCloseTo(-appliances[0]!.draught!, 6);
    expect(opened(openingNeeded! * 1.2).appliances[0]!.spills).toBe(false);
  });

  it('of a sealed or blown appliance is judged by its limit alone', () => {
    const summer = { air: { indoor: 20, outdoor: 32 } };
    for (const vent of ['fan-assisted', 'power-vented', 'direct-vent'])
      expect(solve({ ...summer, appliances: [heater({ vent, flueHeight: 6 })] }).result.appliances[0]!.spills).toBe(
        false,
      );
  });

  it('is told to be near once half of its draught is used up, or half of its limit', () => {
    const near = (pressure: number, appliance: object) =>
      textOf({ exhausts: drawing(pressure), appliances: [appliance] }, 'flue-near');
    expect(near(0.7, heater({ flueHeight: 3, flueTemperature: 30 }))).toMatch(/over half the way/);
    expect(near(0.4, heater({ flueHeight: 3, flueTemperature: 30 }))).toBeUndefined();
    expect(near(1.1, heater())).toMatch(/over half the way/);
    expect(near(0.9, heater())).toBeUndefined();
  });
});
