import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dilution } from '@/lib/worksheets/dilution/about';
import { dilutionAnswer, type DilutionQuestion } from '@/lib/worksheets/dilution/schema';
import { solveDilution } from '@/lib/worksheets/dilution/solve';
import { questions } from './questions';

const liquid = { liquidRate: 0.36, specificGravity: 0.8, molarMass: 60 };
const ask = (more: Partial<DilutionQuestion>) =>
  solveDilution({ generation: { massRate: 6 }, limit: { value: 30, unit: 'mg/m3' }, mixingFactor: 4, ...more });

describe('the answer to any admitted question of dilution', () => {
  it('keeps to its own schema, without a fault', () => {
    fc.assert(
      fc.property(questions, (question) => {
        const answer = dilution.run(question);
        expect(answer.ok && dilutionAnswer.safeParse(answer.value).error).toBeUndefined();
      }),
      { numRuns: 500 },
    );
  });

  it('has K times the air of perfect mixing, and both among its steps, each with a source', () => {
    fc.assert(
      fc.property(questions, (question) => {
        const { result, steps } = solveDilution(question);
        expect(result.airflow / result.perfectMixing).toBeCloseTo(question.mixingFactor, 9);
        expect(steps.map(({ value }) => value)).toEqual(expect.arrayContaining(Object.values(result)));
        for (const { source, label, equation } of steps) expect([source, label, equation]).not.toContain('');
      }),
    );
  });

  it('halves the air for a limit twice as high', () => {
    fc.assert(
      fc.property(questions, (question) => {
        fc.pre(question.limit.value <= 5e5);
        const doubled = { ...question, limit: { ...question.limit, value: 2 * question.limit.value } };
        expect(solveDilution(question).result.airflow / solveDilution(doubled).result.airflow).toBeCloseTo(2, 9);
      }),
    );
  });
});

describe('the working of dilution', () => {
  it('by mass stands as on paper', () => {
    expect(ask({}).steps.map(({ equation }) => equation)).toEqual(['Q = K G / C = 4 × 6 / 30', 'Q / K = 0.8 / 4']);
  });

  it('turns a limit in ppm into mass at 25 °C: 100 ppm of 92.14 g/mol is 376.9 mg/m3', () => {
    const { steps } = ask({ limit: { value: 100, unit: 'ppm' }, molarMass: 92.14 });
    expect(steps[0]).toMatchObject({ equation: 'ppm M / 24.45 = 100 × 92.14 / 24.45', unit: 'mg/m3' });
    expect(steps[0]!.value).toBeCloseTo(376.85, 2);
  });

  it('of a liquid against ppm is the equation of the trade, its rate in litres a second', () => {
    const { steps } = ask({ generation: liquid, limit: { value: 200, unit: 'ppm' } });
    expect(steps[0]!.unit).toBe('L/s');
    expect(steps[0]!.value).toBeCloseTo(0.0001, 15);
    expect(steps[1]!.equation).toBe('Q = 24.12e6 SG ER K / (M C) = 24.12e6 × 0.8 × 0.0001 × 4 / (60 × 200)');
  });

  it('of a liquid against mg/m3 goes by its mass alone: 0.36 L/h of 0.8 is 80 mg/s, at K 4 to 160 mg/m3 2 m3/s', () => {
    const against = (molarMass: number) =>
      ask({ generation: { ...liquid, molarMass }, limit: { value: 160, unit: 'mg/m3' } });
    expect(against(60).steps[0]).toMatchObject({ unit: 'mg/s' });
    expect(against(60).steps[0]!.value).toBeCloseTo(80, 10);
    expect(against(60).result.airflow).toBeCloseTo(2, 12);
    expect(against(120).result.airflow).toBe(against(60).result.airflow);
  });

  it('agrees by mass and by volume to two per cent, what 21 °C and 25 °C differ by', () => {
    const volume = ask({ generation: liquid, limit: { value: 200, unit: 'ppm' } }).result.airflow;
    const mass = ask({ generation: liquid, limit: { value: (200 * 60) / 24.45, unit: 'mg/m3' } }).result.airflow;
    expect(Math.abs(volume / mass - 1)).toBeLessThan(0.02);
  });
});

describe('the table of dilution', () => {
  it('has the air in the units of the address', () => {
    const address = 'generation.massRate=6&limit.value=30&limit.unit=mg/m3&mixingFactor=4';
    // 0.8 m3/s is 2880 m3/h, or 0.8 / 4.719474e-4 = 1695.1 cfm.
    const table = (units: string) => dilution.table(new URLSearchParams(`${address}&units=${units}`));
    expect(table('si')).toMatchObject({
      value: [
        ['Mixing', 'Airflow (m³/h)'],
        ['as asked', 2880],
        ['perfect', 720],
      ],
    });
    expect(table('us')).toMatchObject({ value: [expect.anything(), ['as asked', 1695.1], expect.anything()] });
  });
});
