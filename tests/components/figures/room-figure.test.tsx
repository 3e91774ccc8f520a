import { cleanup, render } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { RoomFigure } from '@/components/figures/room-figure';
import type { RoomBalanceResult } from '@/lib/worksheets/room-balance/schema';
import { numbersIn, tableOf, wordsOf } from './drawn';

afterEach(cleanup);

const exhaust = (name: string, airflow: number) => ({ name, airflow, wanted: airflow });
const appliance = (name: string, spills: boolean) => ({ name, limit: -2, draught: 10, spills });
const result: RoomBalanceResult = {
  ...{ roomPressure: -12, exhausts: [exhaust('saw', 0.2), exhaust('cabinet', 0.05)], shortfall: 0, heat: 0 },
  ...{ makeUp: { supply: 0, openings: 0.15, leakage: 0.1, total: 0.25 }, airChangesPerHour: 10, appliances: [] },
  openingNeeded: null,
};
const drawn = (more: Partial<RoomBalanceResult> = {}) =>
  render(<RoomFigure result={{ ...result, ...more }} system="si" />).container;
/** The bands in order, each by the width of its shaft and the way it points: begins at the tail, then the neck. */
const bands = (container: Element) =>
  [...container.querySelectorAll('path.fill-link')].map((path) => {
    const [tail, top, neck] = numbersIn(path) as [number, number, number];
    const low = /V([\d.]+)H/.exec(path.getAttribute('d')!.split('L').at(-1)!)![1]!;
    return { width: Number(low) - top, right: neck > tail };
  });

describe('the room figure', () => {
  it('says what leaves, what is let in and where the room stands', () =>
    expect(wordsOf(drawn())).toBe(
      '900\u00a0m³/h leave and 900\u00a0m³/h are let in; the room is 12\u00a0Pa below outdoors.',
    ));

  it('draws bands as wide as their flow, so that what comes in is as wide as what leaves', () => {
    const all = bands(drawn());
    expect(all).toHaveLength(4);
    const widest = Math.max(...all.map(({ width }) => width));
    all.forEach(({ width }, i) => expect(width / widest).toBeCloseTo([0.75, 0.5, 1, 0.25][i]!, 6));
    expect(all.every(({ right }) => right)).toBe(true);
  });

  it('turns a band where the air goes the other way', () => {
    const all = bands(drawn({ makeUp: { supply: 0.3, openings: -0.05, leakage: 0, total: 0.25 } }));
    expect(all.map(({ right }) => right)).toEqual([true, false, true, true]);
  });

  it('turns the flue that spills, and says so of it by name', () => {
    const container = drawn({ appliances: [appliance('stove', false), appliance('water heater', true)] });
    const flues = [...container.querySelectorAll('[data-flue]')].map((path) => path.getAttribute('data-flue'));
    expect(flues).toEqual(['turned', 'draws']);
    expect(container.querySelector('[data-flue="turned"]')!.classList.contains('stroke-kiln')).toBe(true);
    expect(wordsOf(container)).toMatch(
      /the flue of the stove still draws by this sum; the flue of the water heater turns: its gas comes into the room/,
    );
    expect(tableOf(container)).toContainEqual(['flue: water heater', 'turns: its gas comes into the room']);
  });

  it('never leaves out a flue that spills, however many there are', () => {
    const many = [...Array.from({ length: 7 }, (_, i) => appliance(`stove ${i}`, false)), appliance('heater', true)];
    const container = drawn({ appliances: many });
    expect(container.querySelectorAll('[data-flue]')).toHaveLength(3);
    expect(container.querySelectorAll('[data-flue="turned"]')).toHaveLength(1);
  });

  it('draws more exhausts than there is room for as one, and has each in the table', () => {
    const many = Array.from({ length: 9 }, (_, i) => exhaust('fan', 0.01 * (i + 1)));
    const container = drawn({ exhausts: many });
    // The five smallest of nine: 0.01 to 0.05 m3/s are 0.15 m3/s together, 540 m3/h.
    const words = [...container.querySelectorAll('svg text')].map(({ textContent }) => textContent);
    expect(words[words.indexOf('5 others') + 1]).toBe('540\u00a0m³/h');
    expect(tableOf(container).filter(([way]) => way === 'out: fan')).toHaveLength(9);
  });

  it('is drawn for a room that nothing enters or leaves', () => {
    const still = { supply: 0, openings: 0, leakage: 0, total: 0 };
    const container = drawn({ roomPressure: 0, exhausts: [], makeUp: still });
    expect(container.innerHTML).not.toMatch(/NaN|Infinity/);
    expect(bands(container)).toEqual([]);
  });
});
