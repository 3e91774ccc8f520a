import type { Metres } from '@/lib/units/quantity';
import { aboveZero, fromZeroUp } from './domain';

/** The diameters that were tested, m: outside them the penalty is an extrapolation. */
export const TESTED_FROM = 0.15;
export const TESTED_TO = 0.25;
/** The validated range of the factor itself, about 30 % pushed together. */
export const TESTED_COMPRESSION = 0.3;

/**
 * How many times more a flexible hose loses when it is not fully stretched: 1 + 0.58 Kc e^(−0.00496 D), with Kc the share by which it is
 * pushed together in % and D in mm. Source: Abushakra, Walker and Sherman (2004); ASHRAE Fundamentals (2021), ch. 21, eq. 22 and 23.
 * Tested on 150 to 250 mm and to about 30 %.
 * @param compression 0 fully stretched, 0.15 pushed together by 15 %
 * @throws RangeError for a negative or endless amount, or a compression of 1 and more
 */
export function compressionFactor(diameter: Metres, compression: number): number {
  aboveZero({ diameter });
  fromZeroUp({ compression });
  if (compression >= 1) throw new RangeError('compression must be below 1');
  return 1 + 0.58 * 100 * compression * Math.exp(-0.00496 * 1000 * diameter);
}
