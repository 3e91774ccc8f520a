import { CUBIC_FOOT, INCH } from '@/lib/units/factors';
import type {
  CubicMetresPerSecond,
  GramsPerMole,
  MilligramsPerCubicMetre,
  MilligramsPerSecond,
} from '@/lib/units/quantity';
import { aboveZero, finite, fromZeroUp } from './domain';

/**
 * How badly a room mixes, K: 1 is perfect, 10 very poor; the airflow is multiplied by it. Another convention divides by a number up to 1:
 * the two are never mixed here. Source: CDC, MMWR 1994;43(RR-13).
 */
export const MIXING = { best: 1, worst: 10 } as const;

/**
 * Air that holds an even release at a concentration: Q = K G / C, m3/s.
 * Source: mass balance; ACGIH Industrial Ventilation, 24th ed. (2001), ch. 2.
 * @param generation mg/s
 * @param concentration mg/m3
 * @throws RangeError for a negative or endless amount, or no concentration
 */
export function dilutionAirflow(
  generation: MilligramsPerSecond,
  concentration: MilligramsPerCubicMetre,
  mixing = 1,
): CubicMetresPerSecond {
  fromZeroUp({ generation, mixing });
  aboveZero({ concentration });
  return finite((mixing * generation) / concentration) as CubicMetresPerSecond;
}

/** US pint, m3: an eighth of a gallon of 231 cubic inches. */
const PINT = (231 * INCH ** 3) / 8;
/** The trade's 403, in ft³ of vapour a pint of liquid of specific gravity 1 and molar mass 1, as a pure number: 24 117. */
const VAPOUR = (403 * CUBIC_FOOT) / PINT;

/**
 * Air that holds an evaporating liquid at a concentration: in US units Q = 403e6 SG ER K / (M C), in SI units 24.1e6
 * SG ER K / (M C). Source: ACGIH Industrial Ventilation, 24th ed. (2001), ch. 2; the SI constant is often rounded to 24.
 * @param liquidRate L/s
 * @param specificGravity of the liquid, water is 1
 * @param molarMass g/mol
 * @param ppm the concentration to hold
 * @throws RangeError for a negative or endless amount
 */
export function evaporationAirflow(
  liquidRate: number,
  specificGravity: number,
  molarMass: GramsPerMole,
  ppm: number,
  mixing = 1,
): CubicMetresPerSecond {
  fromZeroUp({ liquidRate, specificGravity, mixing });
  aboveZero({ molarMass, ppm });
  return finite(
    (VAPOUR * 1e6 * specificGravity * (liquidRate / 1000) * mixing) / (molarMass * ppm),
  ) as CubicMetresPerSecond;
}

/** The share of an airflow that thins: Q / K. */
export function effectiveAirflow(airflow: CubicMetresPerSecond, mixing: number): CubicMetresPerSecond {
  fromZeroUp({ airflow });
  aboveZero({ mixing });
  return (airflow / mixing) as CubicMetresPerSecond;
}
