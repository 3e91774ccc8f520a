import { findRisingRoot } from './find-root';

/** Where the search for an airflow begins, m3/s: a hand-held vacuum. */
const FIRST_GUESS = 0.02;
/** Pa that drive nothing: below it a Reynolds number is too near 0 for its friction factor to be held. */
const NOTHING = 1e-200;

/**
 * The airflow in m3/s that a pressure difference in Pa drives through something that loses `lossAt` Pa at an airflow, whichever way: a
 * negative difference drives it backwards with the same loss.
 * @param lossAt rises with the airflow, from 0 at 0
 */
export function airflowThrough(lossAt: (airflow: number) => number, difference: number): number {
  const size = Math.abs(difference);
  if (size < NOTHING) return 0;
  return Math.sign(difference) * findRisingRoot((q) => lossAt(q) - size, 0, FIRST_GUESS);
}

/** A loss for airflow either way: the loss of the same airflow, with its sign. */
export const eitherWay = (lossAt: (airflow: number) => number) => (airflow: number) =>
  Math.sign(airflow) * lossAt(Math.abs(airflow));
