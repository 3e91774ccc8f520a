import { describe, expect, it } from 'vitest';
import { carbonHolds, carbonLife, PRACTICAL_SHARE } from '@/lib/air/carbon';
import { milligramsPerSecond } from '@/lib/units/quantity';

describe('a bed of carbon', () => {
  it('holds a share of its weight', () => {
    expect(carbonHolds(200, 0.25)).toBe(50);
    expect(() => carbonHolds(100, 1.1)).toThrow(RangeError);
    expect(() => carbonHolds(-1, 0.2)).toThrow(RangeError);
  });

  it('is full when what it holds has come: 50 g at 5 mg/s after 10 000 s, of which a third is counted on', () => {
    expect(carbonLife(200, 0.25, milligramsPerSecond(5))).toBeCloseTo(10_000, 9);
    expect(carbonLife(200, 0.25, milligramsPerSecond(5)) * PRACTICAL_SHARE).toBeCloseTo(3333.3, 1);
  });

  it('agrees with the form in millilitres: (m w / SG) over mL a minute', () => {
    // 454 g of carbon at 27.6 %, xylene of 0.86 evaporating at 0.5 mL/min.
    const minutes = (454 * 0.276) / 0.86 / 0.5;
    const rate = milligramsPerSecond((0.5 * 0.86 * 1000) / 60);
    expect(carbonLife(454, 0.276, rate) / 60).toBeCloseTo(minutes, 9);
  });

  it('has no end where nothing comes, which is refused', () =>
    expect(() => carbonLife(100, 0.2, milligramsPerSecond(0))).toThrow(RangeError));
});
