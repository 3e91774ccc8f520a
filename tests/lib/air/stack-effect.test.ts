import { describe, expect, it } from 'vitest';
import { airDensity } from '@/lib/air/air-density';
import { flueDraught, stackGradient, stackPressure } from '@/lib/air/stack-effect';
import { celsius, metres } from '@/lib/units/quantity';

const SEA = metres(0);
const draught = (height: number, flue: number, outdoor: number) =>
  flueDraught(metres(height), celsius(flue), celsius(outdoor), SEA);

describe('the draught of a flue', () => {
  // ASHRAE Fundamentals (SI, 2021), ch. 21, Examples 1 and 5: the same columns, from their temperatures and not their densities.
  it.each([
    [15, 540, 113],
    [15, -34, -40],
    [12, 815, 104],
  ])('of %d m at %d °C in air of 20 °C is the printed %d Pa', (height, flue, printed) =>
    expect(Math.abs(draught(height, flue, 20) - printed)).toBeLessThan(0.7),
  );

  it('is nothing where flue and outdoors are alike, and downward where the flue is the colder', () => {
    expect(draught(6, 12, 12)).toBe(0);
    expect(draught(6, 20, 32)).toBeLessThan(0);
  });

  it('is the gradient of two airs times the height', () => {
    const [outdoor, indoor] = [celsius(-5), celsius(21)];
    const column = stackPressure(airDensity(outdoor, SEA), airDensity(indoor, SEA), metres(8));
    expect(column / (8 * stackGradient(outdoor, indoor))).toBeCloseTo(1, 2);
  });

  it('is refused at or below absolute zero', () => expect(() => draught(5, -273.15, 0)).toThrow(RangeError));
});
