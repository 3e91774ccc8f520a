import { STANDARD_GRAVITY } from '@/lib/units/factors';
import type { Celsius, KilogramsPerCubicMetre, Metres, Pascals } from '@/lib/units/quantity';
import { ABSOLUTE_ZERO, airDensity } from './air-density';
import { finite } from './domain';

/**
 * Pull of a column of lighter gas: Δp = g (ρ around − ρ inside) Δz, in Pa; negative where the column is the heavier, or leads down.
 * Source: ASHRAE Fundamentals (2021), ch. 21, eq. 9 (with g as 9.81).
 */
export const stackPressure = (around: KilogramsPerCubicMetre, inside: KilogramsPerCubicMetre, height: Metres) =>
  finite(STANDARD_GRAVITY * (around - inside) * height) as Pascals;

/**
 * Difference per metre of height between two airs at sea level: 3460 (1/T outdoors − 1/T indoors), Pa/m, T in kelvin.
 * Source: ASHRAE HVAC Applications (2011), ch. 53, eq. 17.
 */
export const stackGradient = (outdoor: Celsius, indoor: Celsius) =>
  finite(3460 * (1 / (outdoor - ABSOLUTE_ZERO) - 1 / (indoor - ABSOLUTE_ZERO)));

/**
 * Draught of a flue, Pa: the pull of its hot gas, taken as air, against the air outdoors. Without a flue temperature the flue is cold,
 * at the temperature of the room: that is how it has to start, and the worst of its day.
 * @throws RangeError for a temperature at or below absolute zero
 */
export function flueDraught(height: Metres, flue: Celsius, outdoor: Celsius, altitude: Metres): Pascals {
  return stackPressure(airDensity(outdoor, altitude), airDensity(flue, altitude), height);
}
