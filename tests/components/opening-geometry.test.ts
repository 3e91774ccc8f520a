import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { FRAME } from '@/components/figures/figure-frame';
import { scalesOf, velocityLine, type Field } from '@/components/figures/opening-geometry';

const amount = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const fields: fc.Arbitrary<Field> = fc.record({
  ...{ half: amount(0.001, 2), far: amount(0.01, 5), wrap: fc.constantFrom('free', 'flange', 'bench') },
});

/** Points the path passes through: the ends of its curves. */
const pointsOf = (path: string) =>
  path
    .split(/(?=[MC])/)
    .map((part) => part.slice(1).split(',').map(Number).slice(-2))
    .filter((point) => point.length === 2);

describe('a line of equal velocity', () => {
  it('crosses the axis at its distance', () => {
    fc.assert(
      fc.property(fields, amount(0.1, 0.9), (field, share) => {
        const { x, y } = scalesOf(field);
        const wanted = [x(share * field.far), y(field.wrap === 'bench' ? -field.half : 0)];
        const nearest = Math.min(
          ...pointsOf(velocityLine(field, share * field.far)).map(([a, b]) =>
            Math.hypot(a! - wanted[0]!, b! - wanted[1]!),
          ),
        );
        expect(nearest).toBeLessThan(0.2);
      }),
    );
  });

  it('stays within the drawing', () => {
    fc.assert(
      fc.property(fields, (field) => {
        for (const [x, y] of pointsOf(velocityLine(field, field.far / 1.1))) {
          expect(x).toBeGreaterThanOrEqual(0);
          expect(x).toBeLessThanOrEqual(FRAME.width);
          expect(y).toBeGreaterThanOrEqual(0);
          expect(y).toBeLessThanOrEqual(FRAME.height);
        }
      }),
    );
  });
});

it('draws both ways in one measure, so that a circle is a circle', () => {
  fc.assert(
    fc.property(fields, (field) => {
      const { x, y } = scalesOf(field);
      expect((x(field.far) - x(0)) / (y(0) - y(field.far))).toBeCloseTo(1, 9);
    }),
  );
});
