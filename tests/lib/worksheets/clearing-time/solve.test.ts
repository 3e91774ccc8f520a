import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { clearingTime } from '@/lib/worksheets/clearing-time/about';
import { clearingTimeAnswer, type ClearingTimeQuestion } from '@/lib/worksheets/clearing-time/schema';
import { solveClearingTime } from '@/lib/worksheets/clearing-time/solve';
import { questions, sourceGoals } from './questions';

/** V / Q is 300 s, 12 changes an hour. */
const room = { volume: 60, airflow: 0.2 };
const solve = (more: Partial<ClearingTimeQuestion>) => solveClearingTime({ ...room, ...more });

describe('the answer to any admitted question of clearing', () => {
  it('keeps to its own schema, without a fault', () => {
    fc.assert(
      fc.property(questions, (question) => {
        const answer = clearingTime.run(question);
        expect(answer.ok && clearingTimeAnswer.safeParse(answer.value).error).toBeUndefined();
      }),
      { numRuns: 500 },
    );
  });

  it('draws curves that only fall, from all of it, the badly mixed one never below', () => {
    fc.assert(
      fc.property(questions, (question) => {
        const { curve, curvePerfect, time } = solveClearingTime(question).result;
        expect([curve[0], curvePerfect[0]]).toEqual(Array(2).fill({ time: 0, fraction: 1 }));
        expect(curve.at(-1)!.time).toBeGreaterThanOrEqual(time);
        curve.slice(1).forEach(({ fraction }, i) => expect(fraction).toBeLessThanOrEqual(curve[i]!.fraction));
        curve.forEach(({ fraction }, i) => expect(fraction).toBeGreaterThanOrEqual(curvePerfect[i]!.fraction));
      }),
    );
  });

  it('takes K times as long as perfect mixing from the same start', () => {
    fc.assert(
      fc.property(questions, (question) => {
        const { time, perfectMixing } = solveClearingTime(question).result;
        expect(perfectMixing * (question.mixingFactor ?? 1)).toBeCloseTo(time, 6);
      }),
    );
  });

  it('shows the time and the air changes among its steps, each with a source', () => {
    fc.assert(
      fc.property(questions, (question) => {
        const { result, steps } = solveClearingTime(question);
        expect(steps.map(({ value }) => value)).toEqual(expect.arrayContaining([result.time, result.airChanges]));
        for (const { source, label, equation } of steps) expect([source, label, equation]).not.toContain('');
      }),
    );
  });
});

describe('after a source', () => {
  it('the rise ends where the fall begins, and never passes what it would come to', () => {
    fc.assert(
      fc.property(sourceGoals, fc.double({ min: 1, max: 10, noNaN: true }), (goal, mixingFactor) => {
        const { buildUp, peak, steady } = solve({ ...goal, mixingFactor }).result;
        expect(buildUp!.at(-1)).toEqual({ time: 0, fraction: 1 });
        for (const { time, fraction } of buildUp!) {
          expect(time).toBeLessThanOrEqual(0);
          expect(fraction).toBeGreaterThanOrEqual(0);
          expect(fraction).toBeLessThanOrEqual(1 + 1e-9);
        }
        expect(peak!).toBeLessThanOrEqual(steady! * (1 + 1e-12));
      }),
    );
  });

  it('stands at G/Q (1 − 1/e) after one change of air: 3 mg/s into 0.2 m3/s for 300 s is 9.482 mg/m3', () => {
    const { peak, steady, time } = solve({ massRate: 3, duration: 300, to: 1 }).result;
    expect(steady).toBeCloseTo(15, 12);
    expect(peak).toBeCloseTo(15 * (1 - 1 / Math.E), 12);
    expect(time).toBeCloseTo(300 * Math.log(15 * (1 - 1 / Math.E)), 8);
  });

  it('is told from its first moment where it ran less long than the time shown', () => {
    const { buildUp } = solve({ massRate: 3, duration: 60 }).result;
    expect(buildUp![0]).toEqual({ time: -60, fraction: 0 });
  });

  it('that never came to what was asked takes no time', () => {
    const { result, steps } = solve({ massRate: 3, duration: 300, to: 10 });
    expect([result.time, result.perfectMixing]).toEqual([0, 0]);
    expect(result.curve.at(-1)!.time).toBe(300);
    expect(steps.find(({ label }) => label.startsWith('Share'))!.value).toBe(1);
  });

  it('takes a hundredth where nothing is said, and says that this is only practice', () => {
    const { result, steps } = solve({ massRate: 3, duration: 300 });
    expect(result.time).toBeCloseTo(300 * Math.log(100), 9);
    expect(steps.find(({ label }) => label.startsWith('Share'))!.source).toMatch(/no source/);
  });
});

describe('a filter', () => {
  it('adds its clean air to the changes: 0.2 and 0.1 m3/s clear as 0.3 do', () => {
    const { result, steps } = solve({ removal: 0.9, cleanAir: 0.1 });
    expect(result.airChanges).toBeCloseTo(12, 12);
    expect(result.equivalentAirChanges).toBeCloseTo(18, 12);
    expect(result.time).toBeCloseTo(200 * Math.log(10), 9);
    expect(steps.find(({ equation }) => equation === 'Q + CADR = 0.2 + 0.1')!.value).toBeCloseTo(0.3, 12);
  });

  it('goes unsaid where there is none', () => {
    expect(solve({ removal: 0.9, cleanAir: 0 }).result).not.toHaveProperty('equivalentAirChanges');
  });
});

describe('the working of clearing', () => {
  it('stands as on paper', () => {
    // −3 × 300 × ln 0.01 = 4144.65 s.
    expect(solve({ removal: 0.99, mixingFactor: 3 }).steps.map(({ equation }) => equation)).toEqual([
      'n = 3600 Q / V = 3600 × 0.2 / 60',
      '1 − removal = 1 − 0.99',
      't = −K (V / Q) ln(share) = −3 × (60 / 0.2) × ln(0.01)',
      't / K = 4145 / 3',
    ]);
  });

  it('of a source shows what it comes to and where it stopped', () => {
    const equations = solve({ massRate: 3, duration: 300, to: 1, mixingFactor: 2 }).steps.map((each) => each.equation);
    expect(equations).toContain('C = K G / Q = 2 × 3 / 0.2');
    expect(equations).toContain('C (1 − e^(−Q t / (K V))) = 30 × (1 − e^(−0.2 × 300 / (2 × 60)))');
  });
});

describe('the table of clearing', () => {
  it('has a line a point, the rise before 0 without a perfect one beside it', () => {
    const table = clearingTime.table(
      new URLSearchParams('volume=60&airflow=720&massRate=3&duration=300&to=1&units=si'),
    );
    const rows = table.ok ? table.value : [];
    expect(rows[0]).toEqual(['Time (s)', 'Share left', 'Share left, perfect mixing']);
    expect(rows[1]).toEqual([-300, 0, '']);
    expect(rows).toHaveLength(1 + 60 + 61);
    expect(rows[61]).toEqual([0, 1, 1]);
  });
});
