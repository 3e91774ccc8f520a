import { ATOMIC_WEIGHTS } from './elements';
import type { Composition } from './formula';

/** Mass of one mole in g/mol: the sum over the elements of count × atomic weight (IUPAC 2021, abridged). */
export function molarMassOf(composition: Composition): number {
  let sum = 0;
  for (const [symbol, count] of composition) sum += count * ATOMIC_WEIGHTS[symbol]!;
  return sum;
}

/** The share of the mass that one element makes up, 0 to 1; 0 for an element that is not there. */
export function massFractionOf(composition: Composition, symbol: string): number {
  const count = composition.get(symbol) ?? 0;
  return count === 0 ? 0 : (count * ATOMIC_WEIGHTS[symbol]!) / molarMassOf(composition);
}
