import { cleanup, render } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { ClearingFigure } from '@/components/figures/clearing-figure';
import { ClearingTimeView } from '@/components/worksheets/asked/results/clearing-time';
import { solveClearingTime } from '@/lib/worksheets/clearing-time/solve';
import type { ClearingTimeQuestion } from '@/lib/worksheets/clearing-time/schema';

afterEach(cleanup);

/** V / Q is 300 s: to 1 % it takes 23.0 min mixed perfectly, and three times that, 69.1 min, with a factor of 3. */
const room = { volume: 60, airflow: 0.2, mixingFactor: 3 };
const resultOf = (more: Partial<ClearingTimeQuestion>) => solveClearingTime({ ...room, ...more }).result;
const drawn = (more: Partial<ClearingTimeQuestion>) => render(<ClearingFigure result={resultOf(more)} />).container;
const numbersIn = (path: Element) =>
  [...path.getAttribute('d')!.matchAll(/-?\d+(\.\d+)?/g)].map(([text]) => Number(text));

describe('the clearing figure', () => {
  it('says the result in words for both mixing factors', () => {
    expect(drawn({ removal: 0.99 }).querySelector('desc')!.textContent).toBe(
      'It is clear after 69.1 minutes; with perfect mixing after 23.',
    );
  });

  it('draws two curves that stay inside the frame, the perfect one broken', () => {
    const container = drawn({ removal: 0.99 });
    const curves = [...container.querySelectorAll('path.fill-none')].filter((path) =>
      /C/.test(path.getAttribute('d')!),
    );
    expect(curves.map((path) => path.hasAttribute('stroke-dasharray'))).toEqual([true, false]);
    for (const coordinate of curves.flatMap(numbersIn)) {
      expect(coordinate).toBeGreaterThanOrEqual(0);
      expect(coordinate).toBeLessThanOrEqual(440);
    }
  });

  it('has the same numbers in a table, beginning with all of it', () => {
    const rows = [...drawn({ removal: 0.99 }).querySelectorAll('tbody tr')].map((row) =>
      [...row.querySelectorAll('td')].map((cell) => cell.textContent),
    );
    expect(rows[0]).toEqual(['0', '100', '100']);
    expect(rows).toHaveLength(11);
    // The last is 1.25 times the time: 0.01^1.25 = 0.316 %, and that to the third with perfect mixing.
    expect(rows.at(-1)!.slice(0, 2)).toEqual(['86.3', '0.316']);
  });

  it('of a source shows its rise before 0 and says what it came to', () => {
    const container = drawn({ massRate: 3, duration: 900, to: 1 });
    // 45 mg/m3 (1 − e^−1) = 28.4.
    expect(container.querySelector('desc')!.textContent).toMatch(/^When the source stops the room holds 28.4 mg\/m³/);
    expect(container.querySelectorAll('path[d*="C"]')).toHaveLength(3);
    expect(container.querySelector('tbody td')!.textContent).toBe('−15');
  });

  it('of a source that never came so high marks no time', () => {
    const container = drawn({ massRate: 3, duration: 900, to: 100 });
    expect(container.querySelector('.stroke-brass')).toBeNull();
    expect(container.querySelector('desc')!.textContent).toMatch(/no more than the concentration asked for/);
  });
});

describe('the answer of the clearing worksheet', () => {
  const text = (more: Partial<ClearingTimeQuestion>) =>
    render(<ClearingTimeView result={resultOf(more)} question={{}} system="si" />).container.querySelector(
      '[data-result="time"]',
    )!.textContent;

  it('is told in minutes, and from two hours on in hours', () => {
    expect(text({ removal: 0.99 })).toBe('69.1\u2009min');
    cleanup();
    // 0.999 at K 10: 3000 ln 1000 = 20 723 s.
    expect(text({ removal: 0.999, mixingFactor: 10 })).toBe('5.76\u2009h');
  });

  it('is a dash where the source never came to what was asked: no time of nought is shown', () =>
    expect(text({ massRate: 3, duration: 900, to: 100 })).toBe('—'));
});
