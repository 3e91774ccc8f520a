import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { CREEP, openingFor, orificeAirflow, signedPower } from '@/lib/air/orifice';
import { fromInchesOfWater, toCfm } from '@/lib/units/convert';
import { SQUARE_FOOT, STANDARD_AIR } from '@/lib/units/factors';
import { cubicMetresPerSecond, kilogramsPerCubicMetre, squareMetres } from '@/lib/units/quantity';

const standard = kilogramsPerCubicMetre(STANDARD_AIR);

describe('the air through an opening', () => {
  it('is 4005 cfm for a square foot at one inch of water and Cd 1, the constant of the US trade', () =>
    expect(toCfm(orificeAirflow(squareMetres(SQUARE_FOOT), fromInchesOfWater(1), standard, 1))).toBeCloseTo(4005, -1));

  it('turns with the difference, and does not jump where it creeps', () => {
    const at = (difference: number) => orificeAirflow(squareMetres(0.1), difference, standard);
    expect(at(-7)).toBe(-at(7));
    expect(at(0)).toBe(0);
    expect(at(CREEP * (1 + 1e-12)) / at(CREEP * (1 - 1e-12))).toBeCloseTo(1, 9);
  });

  it('goes through the opening that is reckoned for it', () =>
    fc.assert(
      fc.property(
        fc.double({ min: 1e-4, max: 10, noNaN: true }),
        fc.double({ min: CREEP, max: 1000, noNaN: true }),
        (airflow, difference) => {
          const area = openingFor(cubicMetresPerSecond(airflow), difference, standard);
          expect(orificeAirflow(area, difference, standard) / airflow).toBeCloseTo(1, 9);
        },
      ),
    ));

  it('rises with the difference', () =>
    fc.assert(
      fc.property(
        fc.double({ min: -500, max: 500, noNaN: true }),
        fc.double({ min: 1e-6, max: 100, noNaN: true }),
        (from, more) => signedPower(from + more, 0.65) > signedPower(from, 0.65),
      ),
    ));

  it('is refused for an area, a density or a difference that cannot be', () => {
    expect(() => orificeAirflow(squareMetres(-1), 5, standard)).toThrow(RangeError);
    expect(() => orificeAirflow(squareMetres(1), 5, kilogramsPerCubicMetre(0))).toThrow(RangeError);
    expect(() => openingFor(cubicMetresPerSecond(1), 0, standard)).toThrow(RangeError);
  });
});
