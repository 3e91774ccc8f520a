import type { Metres } from '@/lib/units/quantity';
import { aboveZero, finite } from './domain';

/**
 * The round duct that loses as much as a rectangular one at the same airflow: De = 1.30 (a b)^0.625 / (a + b)^0.25, in m.
 * Source: Huebscher (1948), as ASHRAE Fundamentals (2021), ch. 21, eq. 25 and Table 3.
 * @throws RangeError for a negative, zero or endless side
 */
export function equivalentDiameter(a: Metres, b: Metres): Metres {
  aboveZero({ a, b });
  return finite((1.3 * (a * b) ** 0.625) / (a + b) ** 0.25) as Metres;
}
