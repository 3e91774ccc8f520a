import { aboveZero, fromZeroUp } from './domain';

/** Below it the flow is laminar; above the second it is turbulent; between them nobody's equation holds. */
export const LAMINAR_BELOW = 2300;
export const TURBULENT_ABOVE = 4000;
const LOG = Math.log(10);

/** How far a value of 1/√f is from solving Colebrook's equation. */
export const colebrookResidual = (inverseRoot: number, reynolds: number, relativeRoughness: number) =>
  inverseRoot + 2 * Math.log10(relativeRoughness / 3.7 + (2.51 * inverseRoot) / reynolds);

/**
 * Friction factor f of turbulent flow by Colebrook: 1/√f = −2 log10(ε/(3.7 D) + 2.51 / (Re √f)), by Newton's method on 1/√f until it
 * no longer moves: the equation then holds to 1e-12 and better. Source: Colebrook (1939), as ASHRAE Fundamentals (2021), ch. 21, eq. 19.
 * @param reynolds Re, above 0
 * @param relativeRoughness ε/D, at most 1
 * @throws RangeError for a negative or endless amount
 */
export function colebrook(reynolds: number, relativeRoughness: number): number {
  aboveZero({ reynolds });
  fromZeroUp({ relativeRoughness });
  let x = Math.max(1, -1.8 * Math.log10((relativeRoughness / 3.7) ** 1.11 + 6.9 / Math.max(reynolds, 7.1)));
  for (let i = 0; i < 60; i += 1) {
    const inside = relativeRoughness / 3.7 + (2.51 * x) / reynolds;
    const step = colebrookResidual(x, reynolds, relativeRoughness) / (1 + (2 * 2.51) / (reynolds * inside * LOG));
    x -= step;
    if (Math.abs(step) <= 2 * Number.EPSILON * x) break;
  }
  return 1 / x ** 2;
}

/** f of laminar flow: 64 / Re. Source: Hagen and Poiseuille; ASHRAE Fundamentals (2021), ch. 21. */
export const laminar = (reynolds: number) => 64 / reynolds;

/**
 * Friction factor at any Reynolds number: laminar, turbulent, and between them a straight line from the one to the other, which has no
 * source: it only keeps the loss continuous and rising where no equation holds.
 * @throws RangeError for a negative or endless amount
 */
export function frictionFactor(reynolds: number, relativeRoughness: number): number {
  aboveZero({ reynolds });
  if (reynolds <= LAMINAR_BELOW) return laminar(reynolds);
  if (reynolds >= TURBULENT_ABOVE) return colebrook(reynolds, relativeRoughness);
  const share = (reynolds - LAMINAR_BELOW) / (TURBULENT_ABOVE - LAMINAR_BELOW);
  const [from, to] = [laminar(LAMINAR_BELOW), colebrook(TURBULENT_ABOVE, relativeRoughness)];
  return from + share * (to - from);
}
