/**
 * Guards of the formulas: they hold for finite amounts from zero up, and answer anything else with a RangeError and never with a
 * wrong number.
 */
export function fromZeroUp(amounts: Record<string, number>): void {
  for (const name in amounts) {
    const amount = amounts[name]!;
    if (!(amount >= 0 && amount < Infinity)) throw new RangeError(`${name} must be a finite number from 0 up`);
  }
}

export function aboveZero(amounts: Record<string, number>): void {
  fromZeroUp(amounts);
  for (const name in amounts) if (amounts[name] === 0) throw new RangeError(`${name} must be above 0`);
}

/** The amount itself, unless the arithmetic overran what a double holds: then a RangeError and not Infinity or no number. */
export function finite(amount: number): number {
  if (!Number.isFinite(amount)) throw new RangeError('the amounts are too large to reckon with');
  return amount;
}
