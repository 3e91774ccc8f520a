import psychrolib from 'psychrolib';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { airAt, airDensity, airViscosity, atmosphericPressure, ROOM_AIR } from '@/lib/air/air-density';
import { celsius, metres } from '@/lib/units/quantity';

psychrolib.SetUnitSystem(psychrolib.SI);
const real = (min: number, max: number) => fc.double({ min, max, noNaN: true, noDefaultInfinity: true });

describe('the density of air', () => {
  it('is that of an independent library for dry air, anywhere a workshop is', () => {
    fc.assert(
      fc.property(real(-40, 60), real(0, 4000), (temperature, altitude) => {
        const pressure = psychrolib.GetStandardAtmPressure(altitude);
        const theirs = 1 / psychrolib.GetMoistAirVolume(temperature, 1e-7, pressure);
        expect(airDensity(celsius(temperature), metres(altitude)) / theirs).toBeCloseTo(1, 4);
        expect(atmosphericPressure(metres(altitude)) / pressure).toBeCloseTo(1, 5);
      }),
    );
  });

  it('is 1.204 kg/m3 at 20 °C and sea level, as ASHRAE takes it', () => expect(ROOM_AIR.density).toBeCloseTo(1.204, 3));

  it('has a viscosity of 1.82e-5 Pa s at 20 °C (ASHRAE Fundamentals), and more when hot', () => {
    expect(airViscosity(celsius(20))).toBeCloseTo(1.82e-5, 6);
    expect(airAt(celsius(200), metres(0)).viscosity).toBeGreaterThan(ROOM_AIR.viscosity);
  });

  it('refuses what is no air of a workshop', () => {
    expect(() => airDensity(celsius(-274), metres(0))).toThrow(RangeError);
    expect(() => airDensity(celsius(20), metres(20_000))).toThrow(RangeError);
    expect(() => airDensity(celsius(NaN), metres(0))).toThrow(RangeError);
  });
});
