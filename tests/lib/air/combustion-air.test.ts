import { describe, expect, it } from 'vitest';
import { combustionAir, KBTU_PER_HOUR, leastRoomFor } from '@/lib/air/combustion-air';
import { CUBIC_FOOT } from '@/lib/units/factors';
import { watts } from '@/lib/units/quantity';

describe('the air that burning takes', () => {
  it('is twice as much for an old natural draught as for a forced one: 24 and 12 L/s for 30 kW', () => {
    expect(1000 * combustionAir(watts(30_000), true)).toBeCloseTo(24, 9);
    expect(1000 * combustionAir(watts(30_000), false)).toBeCloseTo(12, 9);
  });

  it('needs at 0.42 air changes the 50 cubic feet for each thousand Btu/h of the older rule', () =>
    expect(leastRoomFor(watts(40 * KBTU_PER_HOUR), 0.42, false) / CUBIC_FOOT).toBeCloseTo(50 * 40, 6));

  it('is refused for no air change at all and for a negative power', () => {
    expect(() => leastRoomFor(watts(1000), 0, false)).toThrow(RangeError);
    expect(() => combustionAir(watts(-1), false)).toThrow(RangeError);
  });
});
