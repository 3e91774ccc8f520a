import { MF } from 'mf-parser';
import { describe, expect, it } from 'vitest';
import { parseFormula } from '@/lib/chemistry/formula';
import { molarMassOf } from '@/lib/chemistry/molar-mass';

const ours = (formula: string) => {
  const atoms = parseFormula(formula);
  if (!atoms.ok) throw new Error(atoms.detail);
  return molarMassOf(atoms.value);
};

/** Its masses are averages over isotopes, up to 1.5e-4 off the abridged weights, and it misreads hydrates: those are left out. */
const FORMULAS = [
  'C2H3Cl',
  'C2F4',
  'C6H11NO',
  'C16H14O3',
  'C22H10N2O5',
  '(C2H4O)3H2O',
  'Ca(OH)2',
  'Al2(SO4)3',
  'K4Fe(CN)6',
  'C15H10N2O2',
  'C57H110O6',
  'Pb3O4',
  'Cr2O3',
  'C3H6N6',
];

describe('a molar mass', () => {
  it.each(FORMULAS)('of %s agrees with an independent parser', (formula) =>
    expect(Math.abs(ours(formula) / new MF(formula).getInfo().mass - 1)).toBeLessThan(2e-4),
  );
});
