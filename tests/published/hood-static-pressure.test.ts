import { describe, expect, it } from 'vitest';
import { correctedAirflow, fanStaticPressure, mergedVelocityPressure } from '@/lib/air/balance';
import { entryOf } from '@/lib/air/entry-loss';
import { coefficientOfEntry, coefficientOfEntryFrom, hoodStaticPressure } from '@/lib/air/hood-static-pressure';
import { velocityOf, velocityPressure } from '@/lib/air/velocity-pressure';
import { fromCfm, fromFpm, fromInchesOfWater, fromSquareFeet, toCfm, toFpm } from '@/lib/units/convert';
import { INCH_OF_WATER, STANDARD_AIR } from '@/lib/units/factors';
import { kilogramsPerCubicMetre, metresPerSecond, pascals } from '@/lib/units/quantity';
import { expectPublished, type Row } from './published';

const PRACTICE = 'CIH exam-practice ventilation set 2023-24 (secondary; uses the ABIH equation sheet), question';
const ASHRAE = 'ASHRAE Handbook, Fundamentals (SI, 2021), ch. 21 Duct Design,';
const standard = kilogramsPerCubicMetre(STANDARD_AIR);
const ashraeAir = kilogramsPerCubicMetre(1.204);
const metricAir = kilogramsPerCubicMetre(1.2);
const inches = (pressure: number) => pressure / INCH_OF_WATER;

/** The velocity pressure of an airflow in L/s through a round duct in mm. */
const ofFlow = (litres: number, diameter: number) =>
  velocityPressure(metresPerSecond(litres / 1000 / ((Math.PI * (diameter / 1000) ** 2) / 4)), ashraeAir);

const rows: Row[] = [
  {
    ...{ id: 'T3-01', given: '4005 fpm, in inches of water', published: 1, within: { absolute: 0.005 } },
    ...{ ours: inches(velocityPressure(fromFpm(4005), standard)), source: `${PRACTICE} 13` },
  },
  {
    ...{ id: 'T3-02', given: '4 inches of velocity pressure, in fpm', published: 8010, within: { relative: 0.001 } },
    // The printed 4005 stands on an inch of water at room temperature; the conventional inch that we fixed is 0.17 % more pressure and
    // 0.09 % more velocity, so the tolerance is that choice's.
    ...{ ours: toFpm(velocityOf(fromInchesOfWater(4), standard)), source: `${PRACTICE} 8` },
  },
  {
    ...{ id: 'T3-04', given: '12.9 m/s in metric standard air, in Pa', published: 100, within: { absolute: 0.5 } },
    ...{ ours: velocityPressure(metresPerSecond(12.9), metricAir), source: `${PRACTICE} 14` },
  },
  {
    ...{ id: 'T3-05', given: 'F 0.6 and 2 inches, suction in inches', published: 3.2, within: { absolute: 0.005 } },
    ...{ ours: inches(hoodStaticPressure(fromInchesOfWater(2), 0.6)), source: `${PRACTICE} 9 (prints it negative)` },
  },
  {
    ...{ id: 'T3-07', given: 'Ce of 0.4 against 0.8 inches', published: 0.7, within: { absolute: 0.05 } },
    ...{ ours: coefficientOfEntryFrom(fromInchesOfWater(0.4), fromInchesOfWater(0.8)), source: `${PRACTICE} 15` },
  },
  {
    ...{ id: 'T3-08', given: 'Ce 0.98, 4 inches, 0.196 ft2, in cfm', published: 1539, within: { absolute: 1 } },
    ours: toCfm(fromCfm(0.98 * toFpm(velocityOf(fromInchesOfWater(4), standard)) * 0.196)),
    source: `${PRACTICE} 17`,
  },
  {
    ...{ id: 'T3-10', given: 'grinder, tapered take-off, 336 Pa, in Pa', published: 470, within: { absolute: 1 } },
    ...{ ours: hoodStaticPressure(pascals(336), entryOf('grinder-tapered')!.factor), source: `${ASHRAE} Example 9` },
  },
  {
    ...{ id: 'T3-11', given: '860 L/s in 200 mm, in Pa', published: 451, within: { relative: 0.01 } },
    ...{ ours: ofFlow(860, 200), source: `${ASHRAE} Table 19` },
  },
  {
    ...{ id: 'T3-13', given: '580 L/s in 180 mm, in Pa', published: 313, within: { relative: 0.01 } },
    ...{ ours: ofFlow(580, 180), source: `${ASHRAE} Table 19` },
  },
  {
    ...{ id: 'T3-15', given: '1440 L/s in 355 mm, in Pa', published: 127, within: { relative: 0.01 } },
    ...{ ours: ofFlow(1440, 355), source: `${ASHRAE} Table 19` },
  },
  {
    ...{ id: 'T3-16', given: 'Ce of a flanged end', published: 0.82, within: { absolute: 0.005 } },
    ours: coefficientOfEntry(entryOf('flanged-end')!.factor),
    source: 'F: ACGIH Industrial Ventilation, 24th ed., Fig. 3-16; Ce: course assignment SAFE 4160',
  },
  {
    ...{ id: 'T3-18', given: 'Ce of a grinding hood, straight take-off', published: 0.78, within: { absolute: 0.005 } },
    ours: coefficientOfEntry(entryOf('grinder-straight')!.factor),
    source: 'F: ACGIH Industrial Ventilation, 24th ed., Fig. 3-16; Ce: ventilation practice question 5',
  },
  {
    ...{ id: 'T3-19', given: '200 cfm at 1.5 and 300 at 2.0 merge, in inches', published: 1.8 },
    ours: inches(
      mergedVelocityPressure([
        { airflow: fromCfm(200), pressure: fromInchesOfWater(1.5) },
        { airflow: fromCfm(300), pressure: fromInchesOfWater(2) },
      ]),
    ),
    ...{ within: { absolute: 0.005 }, source: `${PRACTICE} 16` },
  },
  {
    ...{ id: 'T3-21', given: '1500 cfm asked 1 inch and gets 4, in cfm', published: 3000, within: { absolute: 0.5 } },
    ours: toCfm(correctedAirflow(fromCfm(1500), fromInchesOfWater(4), fromInchesOfWater(1))),
    source: `${PRACTICE} 19`,
  },
  {
    ...{ id: 'T3-22', given: 'fan static pressure of 10, −5 and 1 inches', published: 14, within: { absolute: 0.01 } },
    ours: inches(fanStaticPressure(fromInchesOfWater(10), fromInchesOfWater(-5), fromInchesOfWater(1))),
    source: `${PRACTICE} 31, the keyed answer (its working shows 16 by mistake)`,
  },
];

// Left out: X-02, whose key left the area in square feet (prints 14.9 m3/s, the equation gives 1.38).
describe('a published suction comes out', () => {
  it.each(rows)('$id $given', expectPublished);

  it('with the area of T3-08 in square metres too', () =>
    expect(fromSquareFeet(0.196) * velocityOf(fromInchesOfWater(4), standard) * 0.98).toBeCloseTo(fromCfm(1539), 3));
});
