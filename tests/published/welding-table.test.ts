import { describe, expect, it } from 'vitest';
import { weldingRowAt } from '@/lib/air/welding-table';
import { fromInches, toCfm, toInches } from '@/lib/units/convert';
import { expectPublished, type Row } from './published';

const SOURCE = '29 CFR 1910.252(c)(3)(i), table';
const EXACT = { relative: 1e-9 };

/** The printed rows: a look-up, so the airflow must be the printed one and not one near it. Distances in inches from the arc. */
const printed = [
  { id: 'T2-05', from: 4, to: 6, cfm: 150, duct: 3 },
  { id: 'T2-06', from: 6, to: 8, cfm: 275, duct: 3.5 },
  { id: 'T2-07', from: 8, to: 10, cfm: 425, duct: 4.5 },
  { id: 'T2-08', from: 10, to: 12, cfm: 600, duct: 5.5 },
];

const airflows: Row[] = printed.map(({ id, from, to, cfm }) => ({
  ...{ id, given: `welding zone ${from} to ${to} in, in cfm` },
  ...{ ours: toCfm(weldingRowAt(fromInches((from + to) / 2))!.airflow), published: cfm, within: EXACT, source: SOURCE },
}));

// Left out, the printed ducts recomputed from 4000 fpm, which come to 2.6 and 5.2 in and not to the printed 3 and 5.5.
describe('the welding table gives what is printed', () => {
  it.each(airflows)('$id $given', expectPublished);

  it.each(printed)('$id with its duct of $duct in', ({ from, duct }) => {
    expect(toInches(weldingRowAt(fromInches(from + 1))!.duct)).toBeCloseTo(duct, 9);
  });

  // T2-05 to 08 say the rows lie within 3.5 % of 6 V X² at 100 fpm and the far end. The fit is ours, made after the fact.
  it.each(printed)('$id near six times velocity times distance squared', ({ to, cfm }) => {
    expect(Math.abs((6 * 100 * (to / 12) ** 2) / cfm - 1)).toBeLessThan(0.035);
  });
});

describe('the welding table', () => {
  it('takes the farther row where two meet', () =>
    expect(toCfm(weldingRowAt(fromInches(8))!.airflow)).toBeCloseTo(425, 9));
  it('takes its first row for a hood nearer than it starts', () => {
    expect(toCfm(weldingRowAt(fromInches(2))!.airflow)).toBeCloseTo(150, 9);
  });
  it('ends at twelve inches', () => {
    expect(toCfm(weldingRowAt(fromInches(12))!.airflow)).toBeCloseTo(600, 9);
    expect(weldingRowAt(fromInches(12.1))).toBeUndefined();
  });
});
