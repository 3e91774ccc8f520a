import { describe, expect, it } from 'vitest';
import { exampleDocument, EXAMPLE_PLAN } from '@/lib/workshops/example';
import { monthsAfter, upkeepOf } from '@/lib/workshops/upkeep';
import { offersOf, readDocument } from '@/lib/workshops/written';

const face = (date: string, velocity: number) => ({
  exhaust: 'fan',
  kind: 'face-velocity' as const,
  date,
  who: 'keeper',
  velocity,
});
const tap = (date: string, pressure: number) => ({
  exhaust: 'fan',
  kind: 'static-pressure' as const,
  date,
  who: 'keeper',
  pressure,
});

describe('upkeep', () => {
  it('holds the last reading against the first, whatever the order they were written in', () => {
    const [it] = upkeepOf({ readings: [face('2026-06-01', 0.9), face('2026-01-10', 1)] }, '2026-07-01');
    expect(it).toMatchObject({
      baseline: 1,
      last: 0.9,
      drift: expect.closeTo(-0.1, 12),
      due: '2026-09-01',
      overdue: false,
      outOfUse: false,
    });
  });

  it('puts an exhaust out of use that has lost a fifth, or whose suction has changed by as much either way', () => {
    const out = (readings: object[]) => upkeepOf({ readings } as never, '2026-07-01')[0]!.outOfUse;
    expect(out([face('2026-01-01', 1), face('2026-06-01', 0.79)])).toBe(true);
    expect(out([face('2026-01-01', 1), face('2026-06-01', 1.3)])).toBe(false);
    expect(out([tap('2026-01-01', 200), tap('2026-06-01', 245)])).toBe(true);
    expect(out([tap('2026-01-01', 200), tap('2026-06-01', 150)])).toBe(true);
    expect(out([tap('2026-01-01', 200), tap('2026-06-01', 210)])).toBe(false);
  });

  it('is due by the months between readings, over ends of months and years', () => {
    expect(monthsAfter('2026-01-31', 1)).toBe('2026-02-28');
    expect(monthsAfter('2026-11-30', 3)).toBe('2027-02-28');
    expect(monthsAfter('2027-12-15', 2)).toBe('2028-02-15');
    expect(upkeepOf({ readings: [face('2026-01-01', 1)], checkEvery: 6 }, '2026-07-02')[0]).toMatchObject({
      due: '2026-07-01',
      overdue: true,
    });
  });

  it('leaves out a reading that is half-written', () =>
    expect(
      upkeepOf({ readings: [{ exhaust: 'fan', kind: 'face-velocity', date: '2026-01-01' }, {}] }, '2026-07-01'),
    ).toEqual([]));
});

describe('a kept document', () => {
  const NOTHING = { processes: [], materials: [] };

  it('comes back as the plan it was written from', () => {
    const document = exampleDocument();
    const { plan, faults } = readDocument(document, offersOf(document, NOTHING));
    expect(faults).toEqual([]);
    expect(plan.rooms?.map(({ name }) => name)).toEqual(EXAMPLE_PLAN.rooms!.map(({ name }) => name));
    expect(plan.exhausts?.[0]?.fan?.curve).toHaveLength(4);
    expect(plan.exhausts?.[0]?.fan?.curve[1]?.airflow).toBeCloseTo(0.1, 6);
  });

  it('offers the names that are written in it, and leaves out rows that hold nothing', () => {
    const document = `${exampleDocument()}&rooms.2.name=&stations.2.name=`;
    expect(offersOf(document, NOTHING).exhausts).toEqual(['laser exhaust', 'bench fan']);
    const { plan } = readDocument(document, offersOf(document, NOTHING));
    expect(plan.rooms).toHaveLength(2);
    expect(plan.stations).toHaveLength(2);
  });

  it('half-done says what is no number, and loses nothing', () => {
    const { typed, faults } = readDocument('rooms.0.volume=big', offersOf('', NOTHING));
    expect(faults).toEqual([{ path: 'rooms.0.volume', message: expect.any(String) }]);
    expect(typed.texts.get('rooms.0.volume')).toEqual(['big']);
  });
});
