import fc from 'fast-check';
import { all, create } from 'mathjs';
import { describe, expect, it } from 'vitest';
import {
  colebrook,
  colebrookResidual,
  frictionFactor,
  LAMINAR_BELOW,
  TURBULENT_ABOVE,
} from '@/lib/air/friction-factor';

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true, noDefaultInfinity: true });
const math = create(all!, { number: 'BigNumber', precision: 40 });

describe('the friction factor', () => {
  it('solves Colebrook to 1e-12 wherever a duct could be', () => {
    fc.assert(
      fc.property(real(3, 9), real(0, 0.1), (power, rough) => {
        const reynolds = 10 ** power;
        const f = colebrook(reynolds, rough);
        expect(Math.abs(colebrookResidual(1 / Math.sqrt(f), reynolds, rough))).toBeLessThanOrEqual(
          1e-12 * Math.max(1, 1 / Math.sqrt(f)),
        );
      }),
      { numRuns: 5000 },
    );
  });

  it('agrees with the same equation held in forty digits', () => {
    const x = math.bignumber(1 / Math.sqrt(colebrook(1e5, 1e-4)));
    const inside = math.evaluate('1e-4 / 3.7 + 2.51 * x / 1e5', { x });
    expect(Math.abs(Number(math.evaluate('x + 2 * log10(inside)', { x, inside })))).toBeLessThan(1e-14);
  });

  it('is laminar below, turbulent above, and joins both without a jump', () => {
    expect(frictionFactor(2000, 0.01)).toBe(64 / 2000);
    expect(frictionFactor(1e4, 0.01)).toBe(colebrook(1e4, 0.01));
    for (const edge of [LAMINAR_BELOW, TURBULENT_ABOVE])
      expect(frictionFactor(edge + 1e-6, 0.001)).toBeCloseTo(frictionFactor(edge - 1e-6, 0.001), 8);
  });

  it('makes the loss rise with the flow at every Reynolds number', () => {
    fc.assert(
      fc.property(real(1, 1e7), real(1.0001, 3), real(0, 0.05), (reynolds, times, rough) => {
        const loss = (re: number) => frictionFactor(re, rough) * re ** 2;
        expect(loss(reynolds * times)).toBeGreaterThan(loss(reynolds));
      }),
      { numRuns: 5000 },
    );
  });

  it('refuses what is no flow', () => {
    for (const bad of [0, -1, NaN, Infinity]) expect(() => frictionFactor(bad, 0.001)).toThrow(RangeError);
    expect(() => colebrook(1e5, -1)).toThrow(RangeError);
  });
});
