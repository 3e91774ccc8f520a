import { cleanup, render } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { PressureFigure } from '@/components/figures/pressure-figure';
import type { DuctPressureQuestion, DuctPressureResult } from '@/lib/worksheets/duct-pressure/schema';
import { numbersIn, tableOf, wordsOf } from './drawn';

afterEach(cleanup);

const run = (friction: number, fittings: number) => ({
  ...{ velocity: 10, velocityPressure: 60, reynolds: 80_000, frictionFactor: 0.02, friction, fittings },
});
const question: DuctPressureQuestion = {
  ...{ airflow: 0.1, hood: { entryLossFactor: 0.5 } },
  runs: [2, 3].map((length) => ({ duct: 'smooth-plastic', diameter: 0.1, length })),
};
/** 90 behind the hood, 20 + 10 and 30 in the runs, 25 of filter and outlet: 175. */
const result: DuctPressureResult = {
  ...{ staticPressure: 175, hoodStaticPressure: 90, filter: 20, outlet: 5, fanStaticPressure: 115 },
  runs: [run(20, 10), run(30, 0)],
};
const drawn = (more: Partial<DuctPressureResult> = {}, system: 'si' | 'us' = 'si') =>
  render(<PressureFigure {...{ question, system }} result={{ ...result, ...more }} />).container;

describe('the pressure figure', () => {
  it('says what the fan must give, what of it the hood takes, and what a loaded filter adds', () => {
    expect(wordsOf(drawn())).toBe('The fan must give 175\u00a0Pa; the hood takes 90\u00a0Pa of it.');
    cleanup();
    expect(wordsOf(drawn({ loadedStaticPressure: 300 }))).toContain(', and 300\u00a0Pa with the filter loaded;');
  });

  it('adds up from the hood to the end, place by place', () => {
    expect(tableOf(drawn())).toEqual([
      ['before the hood', '0', '0'],
      ['behind the hood', '0', '90'],
      ['end of run 1', '2', '120'],
      ['end of run 2', '5', '150'],
      ['with filter and outlet', '5', '175'],
    ]);
  });

  it('draws a line that only rises, in proportion, and stays in the frame', () => {
    const line = drawn().querySelector('path[stroke-linejoin="round"]')!;
    const numbers = numbersIn(line);
    const [xs, ys] = [0, 1].map((odd) => numbers.filter((_, i) => i % 2 === odd)) as [number[], number[]];
    xs.forEach((x, i) => expect(x).toBeGreaterThanOrEqual(xs[i - 1] ?? 0));
    ys.forEach((y, i) => expect(y).toBeLessThanOrEqual(ys[i - 1] ?? 310));
    expect((ys[0]! - ys[1]!) / (ys[0]! - ys[4]!)).toBeCloseTo(90 / 175, 2);
    expect((xs[2]! - xs[0]!) / (xs[4]! - xs[0]!)).toBeCloseTo(2 / 5, 2);
  });

  it('is drawn for a system without any length', () => {
    const short = { ...question, runs: question.runs.map((each) => ({ ...each, length: 0 })) };
    const { container } = render(<PressureFigure {...{ question: short, result }} system="us" />);
    expect(container.innerHTML).not.toMatch(/NaN|Infinity/);
  });
});
