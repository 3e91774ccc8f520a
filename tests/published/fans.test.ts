import { describe, expect, it } from 'vitest';
import { airDensity } from '@/lib/air/air-density';
import { systemLoss } from '@/lib/air/duct-system';
import { fanOf, type FanCurve } from '@/lib/air/fan-curve';
import { airflowAtSpeed, powerAtDensity, powerAtSpeed, pressureAtSpeed } from '@/lib/air/fan-laws';
import { meetingOf } from '@/lib/air/operating-point';
import { ROOM_AIR } from '@/lib/air/air-density';
import { fromCfm, fromFeet, fromInchesOfWater, toCfm } from '@/lib/units/convert';
import { INCH_OF_WATER } from '@/lib/units/factors';
import { celsius, cubicMetresPerSecond, kilogramsPerCubicMetre, metres, watts } from '@/lib/units/quantity';
import { expectPublished, type Row } from './published';

const HOMEWORK = 'university fan-laws homework set 6 with printed answers';
const PRACTICE = 'CIH exam-practice ventilation set 2023-24 (secondary), question';
const CATALOGUE =
  'air density factors, fan catalogue basics page (altitudes agree with US Bureau of Reclamation, 2006)';
const fahrenheit = (t: number) => celsius((t - 32) / 1.8);
const factor = (t: number, feet: number) =>
  airDensity(fahrenheit(t), fromFeet(feet)) / airDensity(fahrenheit(70), metres(0));
const inches = (pressure: number) => pressure / INCH_OF_WATER;

const row = (id: string, given: string, ours: number, published: number, absolute: number, source: string): Row => ({
  ...{ id, given, ours, published, within: { absolute }, source },
});

/** A straight line as a curve: the fan of T5-19, in its own unnamed units. */
const straight: FanCurve = [0, 20, 40, 60].map((q) => ({
  airflow: cubicMetresPerSecond(q),
  staticPressure: (60 - 0.8 * q) as never,
}));
/** A fixed system on a duct: what +10 % of air costs where everything goes with its square. */
const squareOnly = (q: number) =>
  systemLoss(
    { entryLossFactor: 0.5, runs: [{ duct: 'smooth-plastic', diameter: metres(0.2), length: metres(0) }] },
    cubicMetresPerSecond(q),
    ROOM_AIR,
  ).staticPressure;

const rows: Row[] = [
  row(
    'T5-01',
    '6000 cfm from 2000 to 1500 rpm, in cfm',
    toCfm(airflowAtSpeed(fromCfm(6000), 0.75)),
    4500,
    0.5,
    HOMEWORK,
  ),
  row(
    'T5-02',
    '4 inches from 2000 to 1500 rpm, in inches',
    inches(pressureAtSpeed(fromInchesOfWater(4), 0.75)),
    2.25,
    0.005,
    HOMEWORK,
  ),
  row(
    'T5-04',
    '2000 cfm from 1300 to 1500, in cfm',
    toCfm(airflowAtSpeed(fromCfm(2000), 1500 / 1300)),
    2308,
    0.5,
    HOMEWORK,
  ),
  row('T5-06', '1.0 kW from 1300 to 1500, in kW', powerAtSpeed(watts(1000), 1500 / 1300) / 1000, 1.54, 0.006, HOMEWORK),
  row(
    'T5-07',
    '5 inches from 1000 to 3000 rpm, in inches',
    inches(pressureAtSpeed(fromInchesOfWater(5), 3)),
    45,
    0.5,
    `${PRACTICE} 29`,
  ),
  row(
    'T5-09',
    '1.8 kW at 20 °C, the same speed at 40 °C, in kW',
    powerAtDensity(watts(1800), airDensity(celsius(20), metres(0)), airDensity(celsius(40), metres(0))) / 1000,
    1.685,
    0.001,
    'Stoecker and Jones, fan and duct chapter, printed answer c',
  ),
  row('T5-10', 'density factor at 70 °F, 1000 ft', factor(70, 1000), 0.964, 0.0025, CATALOGUE),
  row('T5-11', 'density factor at 70 °F, 5000 ft', factor(70, 5000), 0.832, 0.0025, CATALOGUE),
  row('T5-13', 'density factor at 200 °F, 6000 ft', factor(200, 6000), 0.643, 0.0025, CATALOGUE),
  row('T5-15', 'density factor at 300 °F, 3000 ft', factor(300, 3000), 0.624, 0.0025, CATALOGUE),
  row(
    'T5-16',
    'catalogue pressure of 1.5 inches at 200 °F, 6000 ft, in inches',
    1.5 / factor(200, 6000),
    2.33,
    0.012,
    CATALOGUE,
  ),
  row(
    'T5-18',
    'pressure for 10 % more air on a fixed system, in %',
    100 * (squareOnly(0.11) / squareOnly(0.1) - 1),
    21,
    0.5,
    'trade press on the second fan law',
  ),
  row(
    'T5-19',
    'H = 60 − 0.8 Q meets H = 20 + 0.5 Q²',
    meetingOf(fanOf(straight), (q) => 20 + 0.5 * q ** 2).crossings[0]!.airflow,
    8.18,
    0.005,
    'hydraulics practice question (generic pump and system curves)',
  ),
];

describe('a published fan comes out', () => {
  it.each(rows)('$id $given', expectPublished);

  it('with a density factor of 1 where the catalogue begins', () => {
    expect(factor(70, 0)).toBe(1);
    expect(airDensity(fahrenheit(70), metres(0))).toBeCloseTo(kilogramsPerCubicMetre(1.2), 2);
  });
});
