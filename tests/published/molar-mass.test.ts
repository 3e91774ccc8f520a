import { describe, expect, it } from 'vitest';
import { parseFormula } from '@/lib/chemistry/formula';
import { massFractionOf, molarMassOf } from '@/lib/chemistry/molar-mass';
import { expectPublished, type Row } from './published';

function read(formula: string) {
  const parsed = parseFormula(formula);
  if (!parsed.ok) throw new Error(parsed.detail);
  return parsed.value;
}

const mass = (id: string, formula: string, published: number, absolute: number, source: string): Row => ({
  ...{ id, given: `${formula}, in g/mol`, ours: molarMassOf(read(formula)), published, within: { absolute }, source },
});

const IUPAC = 'sum by hand of IUPAC 2021 abridged weights';
const rows: Row[] = [
  mass('T6-28', 'CO', 28.01, 0.005, 'NIOSH IDLH documentation, carbon monoxide (1994)'),
  mass('T6-31', 'CH3COC2H5', 72.11, 0.005, 'OSHA method 16, 2-butanone (1980)'),
  mass('T6-33', 'NH3', 17.03, 0.005, 'Kansas State University units hand-out'),
  mass('hydrate', 'CuSO4·5H2O', 249.68, 0.01, `${IUPAC}; two common readings of the dot give 185.6 or 433.6`),
];

describe('a published molar mass comes out', () => it.each(rows)('$id $given', expectPublished));

describe('a mass fraction', () => {
  // 56.7 % is the chlorine content that polymer handbooks print for vinyl chloride resin (from memory).
  it('of chlorine in the vinyl chloride unit is 56.7 %', () => {
    expect(Math.abs(100 * massFractionOf(read('C2H3Cl'), 'Cl') - 56.7)).toBeLessThan(0.05);
  });
  it('of an element that is not there is 0', () => expect(massFractionOf(read('C2H4'), 'Cl')).toBe(0));
  it('of all elements together is 1', () => {
    const formula = read('C22H10N2O5');
    const sum = [...formula.keys()].reduce((total, symbol) => total + massFractionOf(formula, symbol), 0);
    expect(sum).toBeCloseTo(1, 12);
  });
});
