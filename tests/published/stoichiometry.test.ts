import { describe, it } from 'vitest';
import { massFromPpm, ppmFromMass } from '@/lib/chemistry/concentration';
import { parseFormula } from '@/lib/chemistry/formula';
import { massFractionOf, molarMassOf } from '@/lib/chemistry/molar-mass';
import { massAtMost } from '@/lib/chemistry/release';
import { ELEMENT_RULES } from '@/lib/chemistry/release-rules';
import { gramsPerMole, milligramsPerCubicMetre } from '@/lib/units/quantity';
import { expectPublished, type Row } from './published';

const CIAAW = 'hand-computed from the CIAAW conventional weights of 2021';
const atoms = (formula: string) => {
  const read = parseFormula(formula);
  if (!read.ok) throw new Error(read.detail);
  return read.value;
};
const share = (formula: string, symbol: string) => 100 * massFractionOf(atoms(formula), symbol);
const rule = (element: string) => ELEMENT_RULES.find((each) => each.element === element)!;
/** g of the product from 100 g of a polymer. */
const most = (formula: string, element: string) => massAtMost(share(formula, element), rule(element));
const ppmMass = (formula: string) => massFromPpm(1, gramsPerMole(molarMassOf(atoms(formula))));

const row = (id: string, given: string, ours: number, published: number, absolute: number): Row => ({
  ...{ id, given, ours, published, within: { absolute }, source: CIAAW },
});

const rows: Row[] = [
  row('s01', 'chlorine in C2H3Cl, %', share('C2H3Cl', 'Cl'), 56.72, 0.01),
  row('s02', 'hydrogen chloride from C2H3Cl', most('C2H3Cl', 'Cl'), 58.34, 0.01),
  row('s03', 'chlorine in C2H2Cl2, %', share('C2H2Cl2', 'Cl'), 73.14, 0.01),
  row('s04', 'hydrogen chloride from C2H2Cl2', most('C2H2Cl2', 'Cl'), 75.22, 0.01),
  row('s06', 'chlorine in C4H5Cl, %', share('C4H5Cl', 'Cl'), 40.04, 0.01),
  row('s07', 'hydrogen chloride from C4H5Cl', most('C4H5Cl', 'Cl'), 41.18, 0.01),
  row('s09', 'fluorine in C2F4, %', share('C2F4', 'F'), 75.98, 0.01),
  row('s10', 'hydrogen fluoride from C2F4', most('C2F4', 'F'), 80.01, 0.01),
  row('s12', 'hydrogen fluoride from C2H2F2', most('C2H2F2', 'F'), 62.49, 0.01),
  row('s13', 'nitrogen in C6H11NO, %', share('C6H11NO', 'N'), 12.38, 0.01),
  row('s15', 'nitrogen in C12H23NO, %', share('C12H23NO', 'N'), 7.1, 0.01),
  row('s16', 'nitrogen in C3H3N, %', share('C3H3N', 'N'), 26.4, 0.01),
  row('s17', 'hydrogen cyanide from C3H3N', most('C3H3N', 'N'), 50.93, 0.01),
  row('s18', 'nitrogen in a fifth of acrylonitrile, %', 0.2 * share('C3H3N', 'N'), 5.28, 0.01),
  row('s20', 'hydrogen cyanide from a quarter of acrylonitrile', 0.25 * most('C3H3N', 'N'), 12.73, 0.01),
  row('s21', 'hydrogen cyanide a gram of nitrogen', massAtMost(1, rule('N')), 1.9295, 0.0001),
  row('s22', 'hydrogen cyanide from 5 % of nitrogen', massAtMost(5, rule('N')), 9.65, 0.01),
  row('s23', 'nitrogen in C15H10N2O2, %', share('C15H10N2O2', 'N'), 11.19, 0.01),
  row('s24', 'nitrogen in C22H10N2O5, %', share('C22H10N2O5', 'N'), 7.33, 0.01),
  row('s25', 'nitrogen in C3H6N6, %', share('C3H6N6', 'N'), 66.63, 0.01),
  row('s30', 'sulphur dioxide from 2 % of sulphur', massAtMost(2, rule('S')), 4, 0.005),
  row('s31', 'sulphur in C6H4S, %', share('C6H4S', 'S'), 29.64, 0.01),
  row('s36', '1 ppm of hydrogen chloride, mg/m3', ppmMass('HCl'), 1.491, 0.001),
  row('s37', '1 ppm of hydrogen cyanide, mg/m3', ppmMass('HCN'), 1.105, 0.001),
  row('s38', '1 ppm of carbon monoxide, mg/m3', ppmMass('CO'), 1.146, 0.001),
  row('s39', '1 ppm of styrene, mg/m3', ppmMass('C8H8'), 4.26, 0.001),
  row('s40', '1 ppm of methyl methacrylate, mg/m3', ppmMass('C5H8O2'), 4.095, 0.001),
  row('s41', '1 ppm of formaldehyde, mg/m3', ppmMass('CH2O'), 1.228, 0.001),
  row(
    's43',
    'PVC that brings 30 m3 to 5 ppm, g',
    (5 * ppmMass('HCl') * 30) / 1000 / (most('C2H3Cl', 'Cl') / 100),
    0.383,
    0.001,
  ),
  row(
    's43 back',
    '0.383 g of PVC in 30 m3, ppm',
    ppmFromMass(
      milligramsPerCubicMetre((1000 * 0.383 * most('C2H3Cl', 'Cl')) / 100 / 30),
      gramsPerMole(molarMassOf(atoms('HCl'))),
    ),
    5,
    0.01,
  ),
];

// s26 to s28, s32 to s34 are whole conversions by one ratio of molar masses that nothing here is reckoned with, or 100 % by definition.
describe('a hand-computed bound comes out', () => {
  it.each(rows)('$id $given', expectPublished);
});
