import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { ClearingTimeQuestion } from '@/lib/worksheets/clearing-time/schema';
import { solveClearingTime } from '@/lib/worksheets/clearing-time/solve';
import { questions } from './questions';

const share: ClearingTimeQuestion = { volume: 60, airflow: 0.2, mixingFactor: 3, removal: 0.99 };
const source: ClearingTimeQuestion = { volume: 60, airflow: 0.2, mixingFactor: 3, massRate: 3, duration: 300 };
const codes = (question: ClearingTimeQuestion) => solveClearingTime(question).warnings.map(({ code }) => code);

describe('what is said before a time is trusted', () => {
  it('is always that it is for planning, of a room without source and people, mixed evenly', () => {
    fc.assert(
      fc.property(questions, (question) => {
        expect(codes(question)).toEqual(
          expect.arrayContaining([
            ...['planning-only', 'source-must-stop', 'people-out', 'unseen', 'heavy-vapour'],
            ...['even-mixing', 'mixing-convention'],
          ]),
        );
      }),
    );
  });

  it('says each thing once, the cautions that were ticked first, and calls nothing safe', () => {
    fc.assert(
      fc.property(questions, (question) => {
        const all = codes(question);
        const ticked = question.circumstances ?? [];
        expect(new Set(all).size).toBe(all.length);
        expect(new Set(all.slice(0, ticked.length))).toEqual(new Set(ticked));
        expect(JSON.stringify(solveClearingTime(question))).not.toMatch(/\bsafe(ly)?\b/i);
      }),
    );
  });

  it.each([
    ['perfect-mixing', { ...share, mixingFactor: undefined }, share],
    ['perfect-mixing', { ...share, mixingFactor: 1 }, { ...share, mixingFactor: 1.1 }],
    ['share-is-no-limit', share, { ...source, to: 1 }],
    ['limit-is-no-line', { ...source, to: 1 }, share],
    ['share-assumed', source, { ...source, to: 1 }],
    // At K 3 the source comes to 45 (1 − e^(−1/3)) = 12.76 mg/m3.
    ['never-reached', { ...source, to: 12.77 }, { ...source, to: 12.75 }],
    ['filter-is-for-one-thing', { ...share, cleanAir: 0.1 }, { ...share, cleanAir: 0 }],
  ] as [string, ClearingTimeQuestion, ClearingTimeQuestion][])('%s is given and held back', (code, given, held) => {
    expect(codes(given)).toContain(code);
    expect(codes(held)).not.toContain(code);
  });
});
