import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ATOMIC_WEIGHTS } from '@/lib/chemistry/elements';
import { MAX_COUNT, MAX_DEPTH, MAX_FORMULA, parseFormula } from '@/lib/chemistry/formula';

const atomsOf = (text: string) => {
  const read = parseFormula(text);
  return read.ok ? Object.fromEntries(read.value) : read.detail;
};

describe('a formula is read', () => {
  it.each([
    ['C8H8', { C: 8, H: 8 }],
    ['NaCl', { Na: 1, Cl: 1 }],
    ['CO', { C: 1, O: 1 }],
    ['Co', { Co: 1 }],
    ['CH3COOH', { C: 2, H: 4, O: 2 }],
    ['Ca(OH)2', { Ca: 1, O: 2, H: 2 }],
    ['K4[Fe(CN)6]', { K: 4, Fe: 1, C: 6, N: 6 }],
    ['{[(CH2)2]3}2', { C: 12, H: 24 }],
    ['CuSO4·5H2O', { Cu: 1, S: 1, O: 9, H: 10 }],
    ['CuSO₄ • 5 H₂O', { Cu: 1, S: 1, O: 9, H: 10 }],
    ['2H2O', { H: 4, O: 2 }],
  ])('%s', (text, atoms) => expect(atomsOf(text)).toEqual(atoms));
});

describe('a formula is refused with the reason', () => {
  it.each([
    ['', 'Write a formula, such as C8H8.'],
    ['CuSO4.5H2O', 'A full stop may be a decimal point or the dot of a hydrate: write the dot as ·, as in CuSO4·5H2O.'],
    ['(C2H4)n', 'A chain has no one molar mass: write its repeat unit, without n.'],
    ['Xx2', 'Xx is not the symbol of an element.'],
    ['Tc', 'Tc has no standard atomic weight, since it has no stable isotope.'],
    ['NH4+', 'A charge is not read: write the atoms only.'],
    ['Ca(OH', 'A group is not closed: a ) is missing.'],
    ['Ca(OH]2', 'There is a ] that closes nothing.'],
    ['OH)2', 'There is a ) that closes nothing.'],
    ['C()2', 'A group holds no element.'],
    ['C0', 'A count must be from 1 to 10000.'],
    ['water', '“w” does not belong in a formula.'],
    ['H2O·', 'A part of the formula holds no element.'],
    ['constructor', '“c” does not belong in a formula.'],
  ])('%s', (text, why) => expect(atomsOf(text)).toBe(why));
});

describe('the limits of a formula', () => {
  const nested = (depth: number) => '('.repeat(depth) + 'C' + ')'.repeat(depth);
  it('are kept for its length, depth and counts', () => {
    expect(parseFormula('C'.repeat(MAX_FORMULA)).ok).toBe(true);
    expect(parseFormula('C'.repeat(MAX_FORMULA + 1)).ok).toBe(false);
    expect(parseFormula(nested(MAX_DEPTH)).ok).toBe(true);
    expect(parseFormula(nested(MAX_DEPTH + 1)).ok).toBe(false);
    expect(parseFormula(`C${MAX_COUNT}`).ok).toBe(true);
    expect(parseFormula(`C${MAX_COUNT + 1}`).ok).toBe(false);
  });
});

const symbols = fc.constantFrom(...Object.keys(ATOMIC_WEIGHTS));
const atoms = fc.dictionary(symbols, fc.integer({ min: 1, max: 99 }), { minKeys: 1, maxKeys: 12 });

it('reads back what is written from atoms, in a group or not', () => {
  fc.assert(
    fc.property(atoms, fc.integer({ min: 1, max: 9 }), (counts, times) => {
      const text = Object.entries(counts).flat().join('');
      expect(atomsOf(text)).toEqual({ ...counts });
      const grouped = Object.fromEntries(Object.entries(counts).map(([symbol, count]) => [symbol, count * times]));
      expect(atomsOf(`(${text})${times}`)).toEqual(grouped);
    }),
  );
});

it('answers any text without throwing', () => {
  const near = fc.stringMatching(/^[A-Zacln0-9()[\]{}.·+-]{0,20}$/);
  fc.assert(
    fc.property(fc.oneof(fc.string(), near), (text) => {
      const read = parseFormula(text);
      expect(read.ok ? read.value.size : read.detail.length).toBeGreaterThan(0);
    }),
    { numRuns: 400 },
  );
});
