import { describe, expect, it } from 'vitest';
import { roomBalanceRequest } from '@/lib/worksheets/room-balance/schema';
import { solveRoomBalance } from '@/lib/worksheets/room-balance/solve';

const room = { room: { volume: 100 }, air: { indoor: 20, outdoor: 20 } };
const solve = (question: object) => solveRoomBalance(roomBalanceRequest.parse({ ...room, ...question }));
const codes = (question: object) => solve(question).warnings.map(({ code }) => code);
const heater = { name: 'water heater', vent: 'natural-draught', flueHeight: 5, flueTemperature: 80 };

describe('the room worksheet', () => {
  it('lets at most 100 leave where 100 are let in', () => {
    const { result } = solve({ exhausts: [{ name: 'fan', airflow: 0.15 }], makeUp: { supply: 0.1 } });
    expect(result.exhausts[0]!.airflow).toBeCloseTo(0.1, 6);
    expect(result.shortfall).toBeCloseTo(0.05, 6);
    expect(result.makeUp.total).toBeCloseTo(0.1, 6);
  });

  it('goes as far down as the power law turned round: Δp = 50 (Q / Q50)^(1/0.65)', () => {
    const { result } = solve({ exhausts: [{ name: 'fan', airflow: 0.1 }], makeUp: { leakage: { ach50: 6 } } });
    expect(result.roomPressure).toBeCloseTo(-50 * (0.1 / (600 / 3600)) ** (1 / 0.65), 9);
    expect(result.airChangesPerHour).toBeCloseTo(3.6, 9);
  });

  it('goes as far down as an orifice says: Δp = ρ/2 (Q / (Cd A))²', () => {
    const { result } = solve({
      exhausts: [{ name: 'fan', airflow: 0.3 }],
      makeUp: { openings: [{ area: 0.2, dischargeCoefficient: 0.6 }] },
    });
    expect(result.roomPressure).toBeCloseTo((-1.2041 / 2) * (0.3 / 0.12) ** 2, 3);
  });

  it('needs the opening that then holds the limit', () => {
    const tight = {
      exhausts: [{ name: 'fan', airflow: 0.2 }],
      makeUp: { leakage: { ach50: 4 } },
      appliances: [heater],
    };
    const needed = solve(tight).result.openingNeeded!;
    const opened = solve({ ...tight, makeUp: { ...tight.makeUp, openings: [{ area: needed }] } }).result;
    expect(opened.roomPressure).toBeCloseTo(-2, 6);
    expect(
      solve({ ...tight, makeUp: { ...tight.makeUp, openings: [{ area: needed * 1.5 }] } }).result.openingNeeded,
    ).toBeNull();
  });

  it('turns a natural-draught flue first as a tight room is drawn down', () => {
    const appliances = ['natural-draught', 'fan-assisted', 'direct-vent'].map((vent) => ({ name: vent, vent }));
    const spilling = (airflow: number) =>
      solve({ exhausts: [{ name: 'fan', airflow }], makeUp: { leakage: { ach50: 3 } }, appliances })
        .result.appliances.filter(({ spills }) => spills)
        .map(({ name }) => name);
    expect(spilling(0.004)).toEqual([]);
    expect(spilling(0.02)).toEqual(['natural-draught']);
    expect(spilling(0.06)).toEqual(['natural-draught', 'fan-assisted']);
    expect(spilling(0.15)).toEqual(['natural-draught', 'fan-assisted', 'direct-vent']);
  });

  it('leads with the flue’s caution where an appliance is told of, ticked or not, and says that it spills', () => {
    const tight = {
      exhausts: [{ name: 'fan', airflow: 0.2 }],
      makeUp: { leakage: { ach50: 3 } },
      appliances: [heater],
    };
    expect(codes(tight).slice(0, 2)).toEqual(['flued-appliance', 'flue-spills']);
    expect(codes({ ...tight, appliances: undefined })).not.toContain('flued-appliance');
  });

  it('beats a cold flue sooner than a hot one', () => {
    const at = (flueTemperature?: number) =>
      solve({
        air: { indoor: 20, outdoor: 10 },
        exhausts: [],
        makeUp: { leakage: { ach50: 5 } },
        appliances: [{ ...heater, flueTemperature }],
      }).result.appliances[0]!.draught!;
    expect(at(120)).toBeGreaterThan(at());
    // By hand: g H Δρ with ρ = 1.2041 × 293.15 / T: 9.80665 × 5 × (1.2466 − 1.2041) = 2.08 Pa.
    expect(at()).toBeCloseTo(2.08, 1);
  });

  it('takes heat by the mass it lets in: ρ Q cp Δt', () => {
    const { result } = solve({
      air: { indoor: 20, outdoor: 0 },
      exhausts: [{ name: 'fan', airflow: 0.1 }],
      makeUp: { openings: [{ area: 1 }] },
    });
    expect(result.heat / (1.2041 * 0.1 * 1006 * 20)).toBeCloseTo(1, 3);
  });

  it('solves fans on their ducts with the room, and the weaker gives way', () => {
    const fan = (peak: number) => ({
      ...{
        name: `${peak} Pa`,
        hood: { entryLossFactor: 0.5 },
        runs: [{ duct: 'galvanised-steel', diameter: 0.15, length: 4 }],
      },
      fan: {
        curve: [
          { airflow: 0, staticPressure: peak },
          { airflow: 0.2, staticPressure: 0 },
        ],
      },
    });
    const { result } = solve({ exhausts: [fan(60), fan(400)], makeUp: { leakage: { ach50: 3 } } });
    const [weak, strong] = result.exhausts;
    expect(weak!.airflow / weak!.wanted).toBeLessThan(strong!.airflow / strong!.wanted);
    expect(result.exhausts.reduce((sum, { airflow }) => sum + airflow, 0)).toBeCloseTo(result.makeUp.total, 9);
  });

  it('solves machines on one fan, the room and the flue together', () => {
    const fan = {
      curve: [
        { airflow: 0, staticPressure: 500 },
        { airflow: 0.3, staticPressure: 0 },
      ],
    };
    const machine = (name: string, length: number, gate = 'open') => ({
      ...{ name, gate, hood: { entryLossFactor: 0.5 } },
      runs: [{ duct: 'galvanised-steel', diameter: 0.1, length }],
    });
    const shop = (second: string, leakage = { ach50: 2 }) =>
      solve({
        exhausts: [
          {
            name: 'fan',
            fan,
            runs: [{ duct: 'galvanised-steel', diameter: 0.15, length: 3 }],
            branches: [machine('near', 1), machine('far', 12, second)],
          },
        ],
        makeUp: { leakage },
        appliances: [heater],
      }).result;
    const both = shop('open');
    const [near, far] = both.exhausts[0]!.branches!;
    expect(near!.airflow).toBeGreaterThan(far!.airflow);
    expect(near!.airflow + far!.airflow).toBeCloseTo(both.exhausts[0]!.airflow, 9);
    expect(both.exhausts[0]!.airflow).toBeCloseTo(both.makeUp.total, 9);
    expect(both.exhausts[0]!.airflow).toBeLessThan(both.exhausts[0]!.wanted);
    expect(both.appliances[0]!.spills).toBe(true);
    const alone = shop('shut').exhausts[0]!.branches!;
    expect(alone[0]!.airflow).toBeGreaterThan(near!.airflow);
    expect(alone[1]).toMatchObject({ gate: 'shut' });
    // In a room that leaks freely the branches are those of the fan worksheet, with no pressure of the room.
    expect(shop('open', { ach50: 200 }).exhausts[0]!.airflow / both.exhausts[0]!.wanted).toBeGreaterThan(0.98);
  });

  it.each([
    [
      'a fan without a duct',
      {
        exhausts: [
          {
            name: 'fan',
            fan: {
              curve: [
                { airflow: 0, staticPressure: 9 },
                { airflow: 1, staticPressure: 0 },
              ],
            },
          },
        ],
      },
      ['exhausts', 0, 'hood'],
    ],
    ['an exhaust without anything', { exhausts: [{ name: 'fan' }] }, ['exhausts', 0, 'airflow']],
    [
      'two kinds of leakage',
      { exhausts: [], makeUp: { leakage: { ach50: 5, areaAt4Pa: 0.1 } } },
      ['makeUp', 'leakage', 'areaAt4Pa'],
    ],
  ])('refuses %s', (_, more, path) =>
    expect(roomBalanceRequest.safeParse({ ...room, makeUp: {}, ...more }).error?.issues[0]?.path).toEqual(path),
  );
});
