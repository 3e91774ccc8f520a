import type { GramsPerMole, MilligramsPerCubicMetre } from '@/lib/units/quantity';

/** Molar volumes of a gas at one atmosphere, L/mol. Source: OSHA and NIOSH count at 25 °C, HSE at 20 °C. */
export const AT_25 = 24.45;
export const AT_20 = 24.05;

const positive = (name: string, value: number) => {
  if (!(Number.isFinite(value) && value > 0)) throw new RangeError(`${name} must be a finite number above 0`);
};
const fromZero = (name: string, value: number) => {
  if (!(Number.isFinite(value) && value >= 0)) throw new RangeError(`${name} must be a finite number from 0 up`);
};

/**
 * Molar volume of an ideal gas, L/mol: 62.364 T / P, T in kelvin, P in mmHg. Source: gas constant of CODATA 2018 in those units.
 * @throws RangeError for a temperature at or below absolute zero, or no pressure
 */
export function molarVolume(celsius: number, mmHg = 760): number {
  positive('temperature', celsius + 273.15);
  positive('pressure', mmHg);
  return (62.363_598 * (celsius + 273.15)) / mmHg;
}

/**
 * Parts per million by volume as mg/m3: ppm · M / Vm.
 * Source: 29 CFR 1910.1000, footnotes (25 °C, 760 torr); HSE EH40 (20 °C).
 * @param volume L/mol, AT_25 unless told
 * @throws RangeError for a negative or endless amount
 */
export function massFromPpm(ppm: number, molarMass: GramsPerMole, volume = AT_25): MilligramsPerCubicMetre {
  fromZero('ppm', ppm);
  positive('molar mass', molarMass);
  positive('molar volume', volume);
  return ((ppm * molarMass) / volume) as MilligramsPerCubicMetre;
}

/** The same turned round: mg/m3 · Vm / M. */
export function ppmFromMass(concentration: MilligramsPerCubicMetre, molarMass: GramsPerMole, volume = AT_25): number {
  fromZero('concentration', concentration);
  positive('molar mass', molarMass);
  positive('molar volume', volume);
  return (concentration * volume) / molarMass;
}

/** Vapour above a liquid at most, ppm: 1e6 p / 760, p in mmHg. Source: NRC, Prudent Practices (1981), p. 196. */
export function saturationPpm(vapourPressure: number): number {
  fromZero('vapour pressure', vapourPressure);
  return (1e6 * vapourPressure) / 760;
}
