import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { areaOf, diameterOf, ratioOf } from '@/lib/air/face';
import { metres } from '@/lib/units/quantity';
import { amount } from './arbitraries';

const side = amount(0.001, 20).map(metres);

describe('a face', () => {
  it('has the area of its equivalent diameter', () => {
    fc.assert(
      fc.property(side, side, (width, height) => {
        const diameter = diameterOf({ width, height });
        expect(areaOf({ diameter }) / (width * height)).toBeCloseTo(1, 9);
      }),
    );
  });

  it('has a ratio that does not depend on which side is called the width', () => {
    expect(ratioOf({ width: metres(1), height: metres(0.2) })).toBe(0.2);
    expect(ratioOf({ width: metres(0.2), height: metres(1) })).toBe(0.2);
    expect(ratioOf({ diameter: metres(3) })).toBe(1);
  });

  it('without a size is refused', () => {
    expect(() => areaOf({ diameter: metres(0) })).toThrow('diameter must be above 0');
    expect(() => areaOf({ width: metres(1), height: metres(-1) })).toThrow('height');
  });
});
