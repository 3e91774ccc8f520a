import { describe, it } from 'vitest';
import { massFromPpm, molarVolume, ppmFromMass } from '@/lib/chemistry/concentration';
import { mixtureSum } from '@/lib/chemistry/mixture';
import { gramsPerMole, milligramsPerCubicMetre } from '@/lib/units/quantity';
import { expectPublished, type Row } from './published';

const NIOSH = 'NIOSH IDLH documentation, carbon monoxide (1994)';
const row = (id: string, given: string, ours: number, published: number, absolute: number, source: string): Row => ({
  ...{ id, given, ours, published, within: { absolute }, source },
});
const mass = (ppm: number, molarMass: number) => massFromPpm(ppm, gramsPerMole(molarMass));

const rows: Row[] = [
  row(
    'T6-26',
    '500/1000 + 45/200 + 40/200',
    mixtureSum([
      { concentration: 500, limit: 1000 },
      { concentration: 45, limit: 200 },
      { concentration: 40, limit: 200 },
    ]),
    0.925,
    0.0005,
    '29 CFR 1910.1000(d)(2)',
  ),
  row('T6-28', '35 ppm of carbon monoxide, in mg/m3', mass(35, 28.01), 40, 0.5, NIOSH),
  row('T6-30', '25 ppm of carbon monoxide, in mg/m3', mass(25, 28.01), 29, 0.5, `${NIOSH}, quoting the TLV`),
  row('T6-31', '200 ppm of butanone, in mg/m3', mass(200, 72.11), 590, 1, 'OSHA method 16 (1980)'),
  row(
    'T6-33',
    '100 ppm of ammonia, in mg/m3',
    mass(100, 17.03),
    69.652,
    0.02,
    'Kansas State University units hand-out',
  ),
  row(
    'T6-34',
    '50 mg/m3 of ammonia, in ppm',
    ppmFromMass(milligramsPerCubicMetre(50), gramsPerMole(17.03)),
    71.785,
    0.01,
    'Kansas State University units hand-out',
  ),
  row(
    's35',
    'molar volume at 25 °C and 760 torr, in L/mol',
    molarVolume(25),
    24.45,
    0.02,
    '29 CFR 1910.1000, Table Z-1, footnote a',
  ),
  row('EH40', 'molar volume at 20 °C, in L/mol', molarVolume(20), 24.05, 0.01, 'HSE EH40, conversion at 20 °C'),
];

// Left out: X-03, 50 ppm of carbon monoxide printed as 55 mg/m3, which is a rounding of the rule (24.45 gives 57.3).
describe('a published concentration comes out', () => {
  it.each(rows)('$id $given', expectPublished);
});
