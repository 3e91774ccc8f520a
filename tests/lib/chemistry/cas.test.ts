import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { isCas } from '@/lib/chemistry/cas';

/** Registry numbers as printed in the NIOSH Pocket Guide, 2005. */
const PRINTED = ['50-00-0', '630-08-0', '7647-01-0', '100-42-5', '71-43-2', '7664-39-3', '75-44-5', '14808-60-7'];

describe('a CAS number', () => {
  it.each(PRINTED)('takes %s', (cas) => expect(isCas(cas)).toBe(true));

  it('refuses every other check digit', () => {
    for (const cas of PRINTED)
      for (let digit = 0; digit < 10; digit += 1)
        expect(isCas(`${cas.slice(0, -1)}${digit}`)).toBe(String(digit) === cas.at(-1));
  });

  it('refuses any two neighbouring digits exchanged, unless they are alike', () => {
    fc.assert(
      fc.property(fc.constantFrom(...PRINTED), fc.nat(4), (cas, at) => {
        const digits = [...cas.replaceAll('-', '')];
        const [a, b] = [digits[at]!, digits[at + 1]!];
        fc.pre(a !== b && at + 1 < digits.length - 1 && !(at === 0 && b === '0'));
        [digits[at], digits[at + 1]] = [b, a];
        const text = digits.join('');
        expect(isCas(`${text.slice(0, -3)}-${text.slice(-3, -1)}-${text.at(-1)}`)).toBe(false);
      }),
    );
  });

  it.each(['', '50-00', '050-00-0', '50-0-00', 'x50-00-0', '50-00-0 ', '12345678-00-0'])('refuses “%s”', (text) =>
    expect(isCas(text)).toBe(false),
  );
});
