import type { Celsius, CubicMetresPerSecond, Metres, SquareMetres } from '@/lib/units/quantity';
import { finite, fromZeroUp } from './domain';

/** Wind and stack in L/s for each cm2 of leakage area: at the design wind, and for each metre and degree. */
const [WIND, STACK] = [51e-3, 0.35e-3];
/** L/s of a cm2 in m3/s of a m2. */
const PER_SQUARE_METRE = 10;

/**
 * What seeps through the cracks of a house on a cold, windy day with no fan on: Q = A (51 + 0.35 H Δt) / 1000, in L/s with the leakage
 * area at 4 Pa in cm2. It holds for heating, with indoors the warmer. Source: ASHRAE Fundamentals (2021), ch. 17, eq. 10 and Table 5.
 * @throws RangeError for a negative or endless amount, or a room colder than outdoors
 */
export function infiltrationAirflow(
  area: SquareMetres,
  height: Metres,
  indoor: Celsius,
  outdoor: Celsius,
): CubicMetresPerSecond {
  const warmer = indoor - outdoor;
  fromZeroUp({ area, height, warmer });
  return finite(area * PER_SQUARE_METRE * (WIND + STACK * height * warmer)) as CubicMetresPerSecond;
}
