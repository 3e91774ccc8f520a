import { describe, expect, it } from 'vitest';
import { infiltrationAirflow } from '@/lib/air/infiltration';
import { celsius, metres, squareMetres } from '@/lib/units/quantity';

const seeps = (area: number, height: number, indoor: number, outdoor: number) =>
  infiltrationAirflow(squareMetres(area), metres(height), celsius(indoor), celsius(outdoor));

describe('what seeps into a house', () => {
  it('is by hand 500 cm² × (51 + 0.35 × 3 × 25) / 1000 = 38.625 L/s', () =>
    expect(seeps(0.05, 3, 20, -5)).toBeCloseTo(0.038625, 12));

  it('is refused for a house colder than outdoors, which the rule is not for', () =>
    expect(() => seeps(0.05, 3, 20, 25)).toThrow(RangeError));
});
