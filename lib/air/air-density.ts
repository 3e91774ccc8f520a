import type { Celsius, KilogramsPerCubicMetre, Metres, Pascals, PascalSeconds } from '@/lib/units/quantity';
import { finite } from './domain';

/** Air as the duct and the fan see it. */
export type Air = { density: KilogramsPerCubicMetre; viscosity: PascalSeconds };

export const ABSOLUTE_ZERO = -273.15; // °C
const SEA_LEVEL = 101_325; // Pa
const GAS_CONSTANT = 287.055; // J/(kg K), dry air

/**
 * Pressure of the standard atmosphere at an altitude, up to the tropopause at 11 000 m: p = 101 325 (1 − 2.25577e-5 h)^5.2559.
 * Source: ICAO standard atmosphere, as printed in ASHRAE Fundamentals (2021), ch. 1.
 * @throws RangeError outside −500 to 11 000 m
 */
export function atmosphericPressure(altitude: Metres): Pascals {
  if (!(altitude >= -500 && altitude <= 11_000)) throw new RangeError('altitude must be from −500 to 11 000 m');
  return (SEA_LEVEL * (1 - 2.25577e-5 * altitude) ** 5.2559) as Pascals;
}

const kelvin = (temperature: Celsius) => {
  const absolute = temperature - ABSOLUTE_ZERO;
  if (!(absolute > 0 && Number.isFinite(absolute))) throw new RangeError('temperature must be above absolute zero');
  return absolute;
};

/**
 * Density of dry air, kg/m3, by the ideal gas law: ρ = p / (R T). At 20 °C and sea level 1.204, as ASHRAE takes it.
 * @throws RangeError for a temperature at or below absolute zero, or an altitude that is no workshop's
 */
export const airDensity = (temperature: Celsius, altitude: Metres) =>
  finite(atmosphericPressure(altitude) / (GAS_CONSTANT * kelvin(temperature))) as KilogramsPerCubicMetre;

/**
 * Dynamic viscosity of air, Pa s, by Sutherland's formula: μ = 1.458e-6 T^1.5 / (T + 110.4). Source: US Standard Atmosphere 1976.
 * @throws RangeError for a temperature at or below absolute zero
 */
export function airViscosity(temperature: Celsius): PascalSeconds {
  const absolute = kelvin(temperature);
  return finite((1.458e-6 * absolute ** 1.5) / (absolute + 110.4)) as PascalSeconds;
}

/** Density and viscosity at a temperature (°C) and an altitude (m). */
export const airAt = (temperature: Celsius, altitude: Metres): Air => ({
  density: airDensity(temperature, altitude),
  viscosity: airViscosity(temperature),
});

/** Air where nothing else is said: 20 °C at sea level. */
export const ROOM_AIR: Air = airAt(20 as Celsius, 0 as Metres);
