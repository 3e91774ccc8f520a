import type { CubicMetresPerSecond, KilogramsPerCubicMetre, SquareMetres } from '@/lib/units/quantity';
import { aboveZero, fromZeroUp } from './domain';

/** Discharge coefficient of a sharp-edged opening. Source: ASHRAE Fundamentals (2021), 0.6 to 0.65; the lower, cautious one. */
export const DISCHARGE = 0.6;

/**
 * Below this difference, Pa, the flow is taken as proportional to it: there it creeps, and a root would have no end to its slope. It
 * changes an opening's flow by nothing that could be measured.
 */
export const CREEP = 1e-3;

/** |Δp|^n with its sign, straight within ±CREEP. */
export function signedPower(difference: number, exponent: number): number {
  const size = Math.abs(difference);
  if (size >= CREEP) return Math.sign(difference) * size ** exponent;
  return difference * CREEP ** (exponent - 1);
}

/**
 * Air through an opening: Q = Cd A √(2 Δp / ρ), with the sign of the difference. Source: ASHRAE Fundamentals (2021), ch. 16.
 * @param area m2
 * @param difference Pa
 * @param density of the air that comes through, kg/m3
 * @returns m3/s of that air
 * @throws RangeError for a negative or endless amount
 */
export function orificeAirflow(
  area: SquareMetres,
  difference: number,
  density: KilogramsPerCubicMetre,
  coefficient = DISCHARGE,
): CubicMetresPerSecond {
  fromZeroUp({ area, coefficient });
  aboveZero({ density });
  return (coefficient * area * Math.sqrt(2 / density) * signedPower(difference, 0.5)) as CubicMetresPerSecond;
}

/** The opening that lets an airflow in at a difference: A = Q / (Cd √(2 Δp / ρ)), m2. */
export function openingFor(
  airflow: CubicMetresPerSecond,
  difference: number,
  density: KilogramsPerCubicMetre,
  coefficient = DISCHARGE,
): SquareMetres {
  fromZeroUp({ airflow });
  aboveZero({ difference, density, coefficient });
  return (airflow / (coefficient * Math.sqrt((2 * difference) / density))) as SquareMetres;
}
