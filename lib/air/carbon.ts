import type { MilligramsPerSecond, Seconds } from '@/lib/units/quantity';
import { aboveZero, finite, fromZeroUp } from './domain';

const MILLIGRAMS = 1000;

/** How much of the theoretical life is used in practice. Source: a laboratory-hood maker's article, about one third. */
export const PRACTICAL_SHARE = 1 / 3;

/**
 * Vapour that a bed of carbon holds when full: w m, in the unit of the mass. Source: carbon capacity as share of weight, a
 * laboratory-hood maker's article.
 * @param capacity share of its own weight that it takes up, 0 to 1: by vapour, temperature and moisture
 * @throws RangeError for a negative or endless amount, or a capacity above 1
 */
export function carbonHolds(mass: number, capacity: number): number {
  fromZeroUp({ mass, capacity });
  if (capacity > 1) throw new RangeError('capacity must be at most 1');
  return finite(mass * capacity);
}

/**
 * Time until a bed that catches everything is full: t = w m / G, s. `PRACTICAL_SHARE` of it is counted on, and no bed tells when it is
 * spent. Source: the same article.
 * @param mass of the carbon, g
 * @param rate vapour that reaches it, mg/s
 * @throws RangeError for a negative or endless amount, no rate, or a capacity above 1
 */
export function carbonLife(mass: number, capacity: number, rate: MilligramsPerSecond): Seconds {
  aboveZero({ rate });
  return finite((MILLIGRAMS * carbonHolds(mass, capacity)) / rate) as Seconds;
}
