import type { CubicMetres, CubicMetresPerSecond, Pascals, SquareMetres } from '@/lib/units/quantity';
import { aboveZero, fromZeroUp } from './domain';
import { signedPower } from './orifice';

/** Exponent of the leakage of a whole room. Source: ASHRAE Fundamentals (2021), ch. 16: 0.5 to 1, 0.65 where nothing is measured. */
export const LEAKAGE_EXPONENT = 0.65;
/** The density that leakage areas are stated at, kg/m3. Source: ASHRAE Fundamentals (2021), ch. 16. */
const STATED_AT = 1.2;

/** How leaky a room is: an airflow at a difference. */
export type Leakage = { airflow: CubicMetresPerSecond; at: Pascals };

/** From an effective leakage area at 4 Pa (Cd = 1): Q = A √(2 · 4 / ρ). Source: Sherman and Grimsrud (1980); ASHRAE ch. 16. */
export function leakageOfArea(areaAt4Pa: SquareMetres): Leakage {
  fromZeroUp({ areaAt4Pa });
  return { airflow: (areaAt4Pa * Math.sqrt(8 / STATED_AT)) as CubicMetresPerSecond, at: 4 as Pascals };
}

/** From air changes an hour at 50 Pa, as a fan in a door measures: Q = n V / 3600. */
export function leakageOfChanges(ach50: number, volume: CubicMetres): Leakage {
  fromZeroUp({ ach50 });
  aboveZero({ volume });
  return { airflow: ((ach50 * volume) / 3600) as CubicMetresPerSecond, at: 50 as Pascals };
}

/**
 * Air through the cracks of a room: Q = Q₀ (Δp / Δp₀)^0.65, with the sign of the difference. Source: ASHRAE Fundamentals (2021), ch. 16.
 * @returns m3/s
 */
export const leakageAirflow = ({ airflow, at }: Leakage, difference: number) =>
  ((airflow * signedPower(difference, LEAKAGE_EXPONENT)) / at ** LEAKAGE_EXPONENT) as CubicMetresPerSecond;

/** The effective leakage area of a room, m2 at 4 Pa with Cd = 1: A = Q₄ / √(2 · 4 / ρ). Source: as `leakageOfArea`. */
export const effectiveLeakageArea = (leakage: Leakage) =>
  (leakageAirflow(leakage, 4) / Math.sqrt(8 / STATED_AT)) as SquareMetres;

/** The difference that drives an airflow through the cracks of a closed room, the power law turned round: Δp = Δp₀ (Q/Q₀)^(1/0.65). */
export function depressurisationBy(airflow: CubicMetresPerSecond, leakage: Leakage): Pascals {
  fromZeroUp({ airflow });
  aboveZero({ leakage: leakage.airflow });
  return (leakage.at * (airflow / leakage.airflow) ** (1 / LEAKAGE_EXPONENT)) as Pascals;
}
