import { ATOMIC_WEIGHTS } from './elements';
import { parseFormula } from './formula';
import { molarMassOf } from './molar-mass';
import type { ReleaseRule } from './release-rules';

/** Molar mass of a formula that is known to be one, g/mol. @throws RangeError for one that is none */
export function molarMassOfFormula(formula: string): number {
  const atoms = parseFormula(formula);
  if (!atoms.ok) throw new RangeError(atoms.detail);
  return molarMassOf(atoms.value);
}

/**
 * Mass of the product that a mass of an element makes at most, in the same unit: m · M / (per · Ar).
 * Source: conservation of the element; IUPAC 2021 abridged weights.
 * @throws RangeError for a negative or endless mass
 */
export function massAtMost(elementMass: number, { element, formula, per }: ReleaseRule): number {
  if (!(Number.isFinite(elementMass) && elementMass >= 0))
    throw new RangeError('mass must be a finite number from 0 up');
  return (elementMass * molarMassOfFormula(formula)) / (per * ATOMIC_WEIGHTS[element]!);
}

/**
 * Mass a cut turns to smoke and gas, g: length × kerf × thickness × density, lengths in m, density in g/cm3 (1e6 cm3 a m3).
 * Source: geometry. @throws RangeError for a negative or endless amount
 */
export function kerfMass(length: number, kerf: number, thickness: number, density: number): number {
  const mass = length * kerf * thickness * density * 1e6;
  if (![length, kerf, thickness, density].every((each) => each >= 0) || !Number.isFinite(mass))
    throw new RangeError('sizes and density must be finite numbers from 0 up');
  return mass;
}
