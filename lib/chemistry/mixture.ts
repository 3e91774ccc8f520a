/**
 * Sum of the shares that several substances take of their limits, ΣC/L: above 1 the mixture is over, where their effects add.
 * Source: 29 CFR 1910.1000(d)(2).
 * @param parts concentration and limit of each in one unit
 * @throws RangeError for a negative or endless amount, or no limit
 */
export function mixtureSum(parts: readonly { concentration: number; limit: number }[]): number {
  return parts.reduce((sum, { concentration, limit }) => {
    if (!(concentration >= 0 && limit > 0 && Number.isFinite(concentration / limit)))
      throw new RangeError('concentrations must be from 0 up and limits above 0');
    return sum + concentration / limit;
  }, 0);
}
