import { describe, expect, it } from 'vitest';
import { roomBalance } from '@/lib/worksheets/room-balance/about';
import { ROOM_BALANCE_EXAMPLE } from '@/lib/worksheets/room-balance/example';
import { roomBalanceRequest } from '@/lib/worksheets/room-balance/schema';
import { solveRoomBalance } from '@/lib/worksheets/room-balance/solve';

const solve = (question: object) =>
  solveRoomBalance(
    roomBalanceRequest.parse({
      ...{ room: { volume: 100 }, air: { indoor: 20, outdoor: 20 }, exhausts: [{ name: 'fan', airflow: 0.1 }] },
      ...question,
    }),
  );
const codes = (question: object) => solve(question).warnings.map(({ code }) => code);

describe('what is said of a room', () => {
  it.each([
    ['nothing at all', {}],
    ['no air change at 50 Pa', { leakage: { ach50: 0 } }],
    ['a leakage area of 0', { leakage: { areaAt4Pa: 0 } }],
  ])('with %s to let air in is that it is sealed and its exhaust is short', (_, makeUp) => {
    expect(codes({ makeUp })).toEqual(expect.arrayContaining(['room-sealed', 'make-up-short']));
    expect(solve({ makeUp }).result.exhausts[0]!.airflow).toBeCloseTo(0, 9);
  });

  it('that leaks is not that it is sealed', () =>
    expect(codes({ makeUp: { leakage: { ach50: 0.5 } } })).not.toContain('room-sealed'));

  it('with a stated airflow is that few fans hold it, and with a flue that every fan is taken to be on', () => {
    const makeUp = { openings: [{ area: 1 }] };
    expect(codes({ makeUp })).toContain('stated-airflow');
    expect(codes({ makeUp, appliances: [{ name: 'stove', vent: 'open-hearth' }] })).toContain('worst-case');
  });

  it('never calls it harmless', () => {
    for (const makeUp of [{}, { openings: [{ area: 2 }] }])
      for (const { text } of solve({ makeUp, appliances: [{ name: 'stove', vent: 'open-hearth' }] }).warnings)
        expect(text).not.toMatch(/\bsafe/i);
  });

  it('of the example leads with its flue', () =>
    expect(solveRoomBalance(ROOM_BALANCE_EXAMPLE).warnings[0]!.code).toBe('flued-appliance'));
});

describe('the spreadsheet of a room', () => {
  const address = new URLSearchParams(
    'room.volume=100&air.indoor=20&air.outdoor=20&exhausts.0.name=fan&exhausts.0.airflow=360&makeUp.leakage.ach50=3&appliances.0.name=stove&appliances.0.vent=open-hearth',
  );
  it('has what leaves, what comes in, where the room stands and whether a flue is beaten', () => {
    const table = roomBalance.table(address);
    expect(table.ok).toBe(true);
    const rows = table.ok ? table.value : [];
    expect(rows.map(([way]) => way)).toEqual([
      ...['Way', 'Out: fan', 'In: supply', 'In: openings', 'In: leakage', 'In: total', 'Room pressure (Pa)'],
      'Flue of stove pulls (Pa)',
    ]);
    expect(rows.at(-1)!.slice(1)).toEqual(['not known', 'spills']);
    // 360 m3/h out of 100 m3 that lets 300 in at 50 Pa: 50 × 1.2^(1/0.65) = 66.2 Pa below.
    expect(rows.find(([way]) => String(way).startsWith('Room'))![1]).toBeCloseTo(-66.19, 1);
  });
});
