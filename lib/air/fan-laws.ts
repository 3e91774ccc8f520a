import type { CubicMetresPerSecond, KilogramsPerCubicMetre, Pascals, Watts } from '@/lib/units/quantity';
import { aboveZero, finite, fromZeroUp } from './domain';

/*
 * The fan laws for one fan at the same point of its curve: Q ~ N, p ~ N² ρ, P ~ N³ ρ. N is the measured speed of the wheel; the duty
 * cycle of a speed control is not a speed. Source: ASHRAE Systems and Equipment, fans; ACGIH Industrial Ventilation, ch. 6.
 * Each throws RangeError for a negative or endless amount.
 */

/** Airflow at another speed; `ratio` is the new speed over the old. */
export function airflowAtSpeed(airflow: CubicMetresPerSecond, ratio: number): CubicMetresPerSecond {
  fromZeroUp({ airflow, ratio });
  return finite(airflow * ratio) as CubicMetresPerSecond;
}

/** Pressure at another speed. */
export function pressureAtSpeed(pressure: Pascals, ratio: number): Pascals {
  fromZeroUp({ pressure, ratio });
  return finite(pressure * ratio ** 2) as Pascals;
}

/** Power at another speed. */
export function powerAtSpeed(power: Watts, ratio: number): Watts {
  fromZeroUp({ power, ratio });
  return finite(power * ratio ** 3) as Watts;
}

/** Pressure in air of another density: the airflow stays, pressure and power follow the density. */
export function pressureAtDensity(
  pressure: Pascals,
  from: KilogramsPerCubicMetre,
  to: KilogramsPerCubicMetre,
): Pascals {
  fromZeroUp({ pressure, to });
  aboveZero({ from });
  return finite((pressure * to) / from) as Pascals;
}

/** Power in air of another density. */
export function powerAtDensity(power: Watts, from: KilogramsPerCubicMetre, to: KilogramsPerCubicMetre): Watts {
  fromZeroUp({ power, to });
  aboveZero({ from });
  return finite((power * to) / from) as Watts;
}
