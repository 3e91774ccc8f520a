import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evaporatedMass, evaporationAirflow } from '@/lib/air/evaporation';
import { gramsPerMole } from '@/lib/units/quantity';
import { amount } from './arbitraries';

const airflow = (rate: number, gravity: number, molarMass: number, ppm: number, mixing?: number) =>
  evaporationAirflow(rate, gravity, gramsPerMole(molarMass), ppm, mixing);

describe('the air that thins an evaporating liquid', () => {
  it('is within half a per cent of the ideal gas at 21 °C, for which the constant of the trade was made', () => {
    fc.assert(
      fc.property(amount(1e-6, 1), amount(0.5, 2), amount(18, 300), amount(0.1, 1e4), (rate, gravity, mass, ppm) => {
        // Moles a second times the molar volume R T / P of CODATA’s R at 70 °F, over the share of the room that they may be.
        const moles = (1000 * gravity * rate) / mass;
        const volume = (8.314462618 * (273.15 + (70 - 32) / 1.8)) / 101325;
        const ideal = (moles * volume) / (ppm * 1e-6);
        expect(Math.abs(airflow(rate, gravity, mass, ppm) / ideal - 1)).toBeLessThan(0.005);
      }),
    );
  });

  it('is what US units give: 403e6 SG ER K / (M C) cfm, ER in pints a minute', () => {
    const [pint, cfm] = [0.473176473, 4.719474432e-4];
    // Toluene by hand: 403e6 × 0.866 × 0.1 × 4 / (92.14 × 20) = 75 754 cfm.
    const ours = airflow((0.1 * pint) / 60, 0.866, 92.14, 20, 4) / cfm;
    expect(ours / ((403e6 * 0.866 * 0.1 * 4) / (92.14 * 20))).toBeCloseTo(1, 9);
    expect(Math.round(ours)).toBe(75754);
  });

  it('rises with the mixing factor and refuses one of the other convention', () => {
    expect(airflow(1e-5, 0.8, 60, 400, 6) / airflow(1e-5, 0.8, 60, 400)).toBeCloseTo(6, 12);
    expect(() => airflow(1e-5, 0.8, 60, 400, 0.2)).toThrow(/other convention/);
  });

  it('is refused where it has no answer', () => {
    expect(() => airflow(1, 1, 0, 1)).toThrow(RangeError);
    expect(() => airflow(1, 1, 60, 0)).toThrow(RangeError);
    expect(() => airflow(-1, 1, 60, 1)).toThrow(RangeError);
    expect(() => airflow(1, NaN, 60, 1)).toThrow(RangeError);
    expect(() => airflow(1e300, 1, 60, 1e-300)).toThrow(RangeError);
  });
});

describe('the mass that evaporates', () => {
  it('is a kilogram for a litre of water', () => {
    expect(evaporatedMass(1, 1)).toBe(1e6);
    // 36 mL an hour of a liquid of 0.8: 28.8 g an hour, 8 mg/s.
    expect(evaporatedMass(0.036 / 3600, 0.8)).toBeCloseTo(8, 12);
    expect(() => evaporatedMass(-1, 1)).toThrow(RangeError);
  });
});
