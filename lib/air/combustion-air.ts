import { CUBIC_FOOT } from '@/lib/units/factors';
import type { CubicMetres, CubicMetresPerSecond, Watts } from '@/lib/units/quantity';
import { aboveZero, fromZeroUp } from './domain';

/** One thousand British thermal units an hour, W (ISO 31-4 value of the Btu, 1055.056 J). */
export const KBTU_PER_HOUR = 1_055_056 / 3600;

/**
 * Air that burning takes: 0.4 L/s for each kW with a forced draught, twice that for an old one with a natural draught.
 * Source: ASHRAE Fundamentals (2021), ch. 17, combustion air.
 * @throws RangeError for a negative or endless amount
 */
export function combustionAir(power: Watts, naturalDraught: boolean): CubicMetresPerSecond {
  fromZeroUp({ power });
  return ((power / 1000) * 0.0004 * (naturalDraught ? 2 : 1)) as CubicMetresPerSecond;
}

/**
 * The least room whose leakage is enough for an appliance that takes its air from it: 21 ft³ · I / ACH (15 where it is fan-assisted),
 * I in thousand Btu/h. Source: NFPA 54, known air infiltration rate, as printed in furnace manuals; it holds up to 0.60 air changes.
 * @throws RangeError for a negative or endless amount
 */
export function leastRoomFor(power: Watts, airChanges: number, fanAssisted: boolean): CubicMetres {
  fromZeroUp({ power });
  aboveZero({ airChanges });
  return ((((fanAssisted ? 15 : 21) * power) / KBTU_PER_HOUR / airChanges) * CUBIC_FOOT) as CubicMetres;
}
