import { describe, expect, it } from 'vitest';
import { airChanges } from '@/lib/air/air-changes';
import { combustionAir, KBTU_PER_HOUR, leastRoomFor } from '@/lib/air/combustion-air';
import { infiltrationAirflow } from '@/lib/air/infiltration';
import { depressurisationBy, leakageAirflow, leakageOfArea, leakageOfChanges } from '@/lib/air/leakage';
import { stackGradient, stackPressure } from '@/lib/air/stack-effect';
import { velocityOf } from '@/lib/air/velocity-pressure';
import { fromCfm, fromInchesOfWater, toCfm, toFpm } from '@/lib/units/convert';
import { CUBIC_FOOT, INCH_OF_WATER, SQUARE_INCH, STANDARD_AIR } from '@/lib/units/factors';
import { celsius, cubicMetres, kilogramsPerCubicMetre, metres, squareMetres, watts } from '@/lib/units/quantity';
import { expectPublished, type Row } from './published';

const ASHRAE = 'ASHRAE Handbook, Fundamentals (SI, 2021), ch. 21 Duct Design,';
const RESIDENTIAL = 'ASHRAE Handbook, Fundamentals (SI, 2021), ch. 17,';
const NFPA = 'NFPA 54, known air infiltration rate, as printed in furnace manuals';
const density = kilogramsPerCubicMetre;
const pull = (inside: number, height: number) => stackPressure(density(1.204), density(inside), metres(height));
const leastRoom = (kbtu: number, changes: number, assisted: boolean) =>
  leastRoomFor(watts(kbtu * KBTU_PER_HOUR), changes, assisted) / CUBIC_FOOT;

/** The airflow in cfm at 50 Pa of one square inch of leakage area. */
const cfmAt50 = toCfm(leakageAirflow(leakageOfArea(squareMetres(SQUARE_INCH)), 50));

/** L/s that seep through each cm2 of leakage area of a house at 20 °C. */
const seeps = (height: number, outdoor: number) =>
  1000 * infiltrationAirflow(squareMetres(1e-4), metres(height), celsius(20), celsius(outdoor));

const row = (id: string, given: string, ours: number, published: number, absolute: number, source: string): Row => ({
  ...{ id, given, ours, published, within: { absolute }, source },
});

const rows: Row[] = [
  row(
    'T7-01',
    '1200 cfm at 50 Pa in 1500 × 8 ft, air changes',
    airChanges(fromCfm(1200), cubicMetres(1500 * 8 * CUBIC_FOOT)),
    6,
    0.005,
    'home-performance glossary, ACH50',
  ),
  row(
    'T7-03',
    'cfm at 50 Pa of a square inch at 4 Pa',
    cfmAt50,
    18.2,
    0.1,
    'load-calculation documentation; Sherman and Grimsrud (1980)',
  ),
  row(
    'T7-04',
    'velocity of 0.05 inches, in fpm',
    toFpm(velocityOf(fromInchesOfWater(0.05), density(STANDARD_AIR))),
    895,
    1.5,
    'air-leakage article (2008), which cuts √0.05 short',
  ),
  row('T7-06', '15 m of −34 °C air, in Pa', pull(1.477, 15), -40, 0.6, `${ASHRAE} Example 1a`),
  row('T7-07', '15 m of 540 °C gas, in Pa', pull(0.434, 15), 113, 0.6, `${ASHRAE} Example 1b`),
  row('T7-09', '18 m down of −34 °C air, in Pa', pull(1.477, -18), 48, 0.6, `${ASHRAE} Example 3a`),
  row('T7-11', '12 m of 815 °C gas, in Pa', pull(0.324, 12), 104, 0.6, `${ASHRAE} Example 5, path 1-2`),
  row(
    'T7-13',
    'losses of 170 and 70 Pa with the stack against them, in Pa',
    170 + 70 + pull(1.477, -18),
    288,
    0.5,
    `${ASHRAE} Example 3b`,
  ),
  row(
    'T7-14',
    'gradient of 10 against 23 °C, in Pa/m',
    stackGradient(celsius(283.2 - 273.15), celsius(296.2 - 273.15)),
    0.54,
    0.005,
    'ASHRAE HVAC Applications (2011), ch. 53, eq. 17',
  ),
  row('T7-15', '30 kBtu/h at 0.6 changes, in ft3', leastRoom(30, 0.6, false), 1050, 0.5, NFPA),
  row('T7-17', '40 kBtu/h at 0.2 changes, in ft3', leastRoom(40, 0.2, false), 4200, 0.5, NFPA),
  row('T7-18', '50 kBtu/h fan-assisted at 0.6 changes, in ft3', leastRoom(50, 0.6, true), 1250, 0.5, NFPA),
  row('T7-20', '1 cm2, 2.5 m, −10 °C, in L/s', seeps(2.5, -10), 0.077, 0.0006, `${RESIDENTIAL} eq. 10, Table 5`),
  row('T7-22', '1 cm2, 5 m, −20 °C, in L/s', seeps(5, -20), 0.12, 0.0055, `${RESIDENTIAL} eq. 10, Table 5`),
  row(
    'T7-24',
    'combustion air of 30 kW, in L/s',
    1000 * combustionAir(watts(30_000), false),
    12,
    0.05,
    `${RESIDENTIAL} combustion air`,
  ),
  row(
    'T7-25',
    '−2.5 Pa, in inches of water',
    -2.5 / INCH_OF_WATER,
    -0.01,
    0.0005,
    'minimum draught table, as reprinted in an audit form',
  ),
];

describe('a published room comes out', () => {
  it.each(rows)('$id $given', expectPublished);

  it('closed and exhausted, at the power law turned round', () => {
    const leakage = leakageOfChanges(6, cubicMetres(100));
    expect(leakageAirflow(leakage, depressurisationBy(fromCfm(150), leakage))).toBeCloseTo(fromCfm(150), 10);
    expect(depressurisationBy(leakage.airflow, leakage)).toBeCloseTo(50, 10);
  });
});
