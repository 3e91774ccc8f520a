import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { DilutionQuestion } from '@/lib/worksheets/dilution/schema';
import { solveDilution } from '@/lib/worksheets/dilution/solve';
import { questions } from './questions';

const mass: DilutionQuestion = {
  generation: { massRate: 3 },
  limit: { value: 30, unit: 'mg/m3' },
  mixingFactor: 4,
};
const liquid = { ...mass, generation: { liquidRate: 0.01, specificGravity: 0.8, molarMass: 60 } };
const codes = (question: DilutionQuestion) => solveDilution(question).warnings.map(({ code }) => code);

describe('what is said before air is trusted to thin', () => {
  it('is always that capture comes first, and what an average leaves out', () => {
    fc.assert(
      fc.property(questions, (question) => {
        expect(codes(question)).toEqual(
          expect.arrayContaining([
            ...['capture-first', 'not-at-the-source', 'limit-is-no-line', 'even-mixing'],
            ...['mixing-convention', 'air-must-come-in'],
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
        expect(JSON.stringify(solveDilution(question))).not.toMatch(/\bsafe(ly)?\b/i);
      }),
    );
  });

  it.each([
    // 3 mg/s at K 4: to 12 mg/m3 it takes 1 m3/s, to a little less more.
    ['much-air', { ...mass, limit: { value: 11.9, unit: 'mg/m3' } }, { ...mass, limit: { value: 12, unit: 'mg/m3' } }],
    ['vapour-burns', liquid, mass],
    ['perfect-mixing', { ...mass, mixingFactor: 1 }, { ...mass, mixingFactor: 1.1 }],
    // Air is 28.96 g/mol: ammonia, at 17, rises; propanol, at 60, sinks; and of what is unknown the worse is said.
    ['heavy-vapour', liquid, { ...mass, molarMass: 17.03 }],
    ['heavy-vapour', mass, { ...liquid, generation: { ...liquid.generation, molarMass: 28 } }],
  ] as [string, DilutionQuestion, DilutionQuestion][])('%s is given and held back', (code, given, held) => {
    expect(codes(given)).toContain(code);
    expect(codes(held)).not.toContain(code);
  });

  it('tells what much air is in both systems', () => {
    const { warnings } = solveDilution({ ...mass, limit: { value: 1, unit: 'mg/m3' } });
    // 1 m3/s is 3600 m3/h, or 2119 cfm.
    expect(warnings.find(({ code }) => code === 'much-air')!.text).toContain('3600\u00a0m³/h (2120\u00a0cfm)');
  });
});
