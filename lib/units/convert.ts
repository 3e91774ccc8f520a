import { CFM, FOOT, FPM, INCH, INCH_OF_WATER, SQUARE_FOOT } from './factors';
import type { CubicMetresPerSecond, Metres, MetresPerSecond, Pascals, SquareMetres } from './quantity';

/** US customary to SI and back, with the exact factors of NIST SP 811; one name a direction, so that none is used the wrong way. */
export const fromFeet = (value: number) => (value * FOOT) as Metres;
export const fromInches = (value: number) => (value * INCH) as Metres;
export const fromSquareFeet = (value: number) => (value * SQUARE_FOOT) as SquareMetres;
export const fromFpm = (value: number) => (value * FPM) as MetresPerSecond;
export const fromCfm = (value: number) => (value * CFM) as CubicMetresPerSecond;
export const fromInchesOfWater = (value: number) => (value * INCH_OF_WATER) as Pascals;

export const toInches = (value: Metres) => value / INCH;
export const toFpm = (value: MetresPerSecond) => value / FPM;
export const toCfm = (value: CubicMetresPerSecond) => value / CFM;
export const toCubicMetresPerHour = (value: CubicMetresPerSecond) => value * 3600;
