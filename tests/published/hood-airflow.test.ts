import { describe, expect, it } from 'vitest';
import { canopyAirflow } from '@/lib/air/canopy';
import { enclosureAirflow, faceVelocity } from '@/lib/air/enclosure';
import { flangedOpeningVelocity } from '@/lib/air/flanged-opening';
import { areaOf } from '@/lib/air/face';
import { plainOpeningVelocity } from '@/lib/air/plain-opening';
import { plainSlotVelocity } from '@/lib/air/plain-slot';
import { fromCfm, fromFeet, fromFpm, fromInches, fromSquareFeet, toCfm, toFpm } from '@/lib/units/convert';
import { metres, metresPerSecond } from '@/lib/units/quantity';
import { expectPublished, type Row } from './published';

const PRACTICE = 'CIH exam-practice ventilation set 2023-24 (secondary; uses the ABIH equation sheet), question';
const FOOT = fromFeet(1);
const sixInches = areaOf({ width: fromInches(6), height: fromInches(6) });
const door = areaOf({ width: fromFeet(3), height: fromFeet(3) });

/** The air through a round opening when it moves at 1 m/s there: what T1-10 and T1-13 compare with. */
const atFace = (diameter: number, velocity: number) => {
  const area = areaOf({ diameter: metres(diameter) });
  return { area, airflow: enclosureAirflow(metresPerSecond(velocity), area) };
};
const decay = atFace(1, 1);
const small = atFace(0.25, 3);

const rows: Row[] = [
  {
    ...{ id: 'T1-01', given: 'plain opening 6 × 6 in, 600 cfm, at 1 ft, in fpm' },
    ...{ ours: toFpm(plainOpeningVelocity(fromCfm(600), FOOT, sixInches)), published: 59, within: { absolute: 0.5 } },
    source: `${PRACTICE} 35`,
  },
  {
    ...{ id: 'T1-03', given: 'slot 12 × 2 in, 600 cfm, at 1 ft, in fpm' },
    ...{
      ours: toFpm(plainSlotVelocity(fromCfm(600), FOOT, fromInches(12))),
      published: 162,
      within: { absolute: 0.5 },
    },
    source: `${PRACTICE} 33, worked solution (its answer letter is misprinted)`,
  },
  {
    ...{ id: 'T1-05', given: 'booth 3 × 3 ft, 200 fpm, in cfm' },
    ...{ ours: toCfm(enclosureAirflow(fromFpm(200), door)), published: 1800, within: { absolute: 0.5 } },
    source: `${PRACTICE} 37 (prints the unit as fpm)`,
  },
  {
    ...{ id: 'T1-06', given: 'canopy 1 ft above a tank 5 × 3 ft, 200 fpm, in cfm' },
    ...{ ours: toCfm(canopyAirflow(fromFpm(200), FOOT, fromFeet(16))), published: 4480, within: { absolute: 0.5 } },
    source: `${PRACTICE} 38`,
  },
  {
    ...{ id: 'T1-08', given: 'flanged multi-slot of 4 ft2, 400 cfm, at 2 ft, in fpm' },
    ...{ ours: toFpm(flangedOpeningVelocity(fromCfm(400), fromFeet(2), fromSquareFeet(4))), published: 12.1 },
    ...{ within: { absolute: 0.05 }, source: `${PRACTICE} 40` },
  },
  {
    ...{ id: 'T1-10', given: 'round plain opening, at one diameter, in % of face velocity' },
    ...{
      ours: 100 * plainOpeningVelocity(decay.airflow, metres(1), decay.area),
      published: 7.5,
      within: { absolute: 0.3 },
    },
    source: 'National Research Council, Prudent Practices (1981), p. 207: "approximately"',
  },
  {
    ...{ id: 'T1-12', given: 'hood face of 50 ft2, 100 fpm, in cfm' },
    ...{ ours: toCfm(enclosureAirflow(fromFpm(100), fromSquareFeet(50))), published: 5000, within: { absolute: 0.5 } },
    source: 'Crowl and Louvar, Chemical Process Safety, ventilation chapter (lecture extract)',
  },
  {
    // The source uses a point-sink form for small outlets, v = v0 π d²/(48 x²), which we do not compute with: it gives 0.196. Ours
    // gives 0.218. Both round to the printed 0.2, so the row is kept as a witness from an equation that is not our own.
    ...{ id: 'T1-13', given: 'small outlet 0.25 m, 3 m/s, at 0.25 m, in m/s' },
    ...{
      ours: plainOpeningVelocity(small.airflow, metres(0.25), small.area),
      published: 0.2,
      within: { absolute: 0.05 },
    },
    source: 'general engineering reference, small-outlet suction (2005)',
  },
  {
    ...{ id: 'T2-01', given: 'downdraft booth of 1000 ft2, 60 000 cfm, in fpm' },
    ...{ ours: toFpm(faceVelocity(fromCfm(60000), fromSquareFeet(1000))), published: 60, within: { absolute: 0.5 } },
    source: 'coatings trade answer, June 2004, on 29 CFR 1910.94 Table G-10',
  },
  {
    // The enclosure's own row repeats T1-05: no other published opening example was found.
    ...{ id: 'T9-01', given: 'enclosure opening 3 × 3 ft, 200 fpm, in cfm' },
    ...{ ours: toCfm(enclosureAirflow(fromFpm(200), door)), published: 1800, within: { absolute: 0.5 } },
    source: `${PRACTICE} 37`,
  },
];

// Left out, because the equations do not give what is printed: X-07, a canopy formula whose units do not balance (prints 1.7 m3/s, the
// perimeter form gives 1.44). T2-02 and T2-03 are conversions and stand with the units.
describe('a published hood comes out', () => {
  it.each(rows)('$id $given', expectPublished);

  it('T1-03 with a slot that is one by the ratio', () => expect(2 / 12).toBeLessThan(0.2));
});
