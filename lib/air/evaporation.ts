import { CUBIC_FOOT, INCH } from '@/lib/units/factors';
import type { CubicMetresPerSecond, GramsPerMole, MilligramsPerSecond } from '@/lib/units/quantity';
import { aboveZero, finite, fromZeroUp } from './domain';
import { fromOneUp } from './mixing';

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
 * @throws RangeError for a negative or endless amount, or mixing below 1
 */
export function evaporationAirflow(
  liquidRate: number,
  specificGravity: number,
  molarMass: GramsPerMole,
  ppm: number,
  mixing = 1,
): CubicMetresPerSecond {
  fromZeroUp({ liquidRate, specificGravity });
  aboveZero({ molarMass, ppm });
  fromOneUp(mixing);
  return finite(
    (VAPOUR * 1e6 * specificGravity * (liquidRate / 1000) * mixing) / (molarMass * ppm),
  ) as CubicMetresPerSecond;
}

/**
 * Mass of a liquid that evaporates: G = 1e6 SG ER, mg/s, a litre of water being 1 kg. Source: definition of specific gravity.
 * @param liquidRate L/s
 * @throws RangeError for a negative or endless amount
 */
export function evaporatedMass(liquidRate: number, specificGravity: number): MilligramsPerSecond {
  fromZeroUp({ liquidRate, specificGravity });
  return finite(1e6 * specificGravity * liquidRate) as MilligramsPerSecond;
}
