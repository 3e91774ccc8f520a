import fc from 'fast-check';
import type { Hood } from '@/lib/air/hood-airflow';
import { metres, squareMetres } from '@/lib/units/quantity';

/** Amounts a workshop could meet, and hoods made of them. Lengths in m. */
export const amount = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const length = amount(0.01, 5).map(metres);
const rectangle = fc.record({ width: length, height: length });
const face = fc.oneof(fc.record({ diameter: length }), rectangle);

export const hoods: fc.Arbitrary<Hood> = fc.oneof(
  fc.record({ hood: fc.constantFrom('plain-opening', 'flanged-opening', 'bench-opening'), face }),
  fc.record({ hood: fc.constantFrom('plain-slot', 'flanged-slot'), face: rectangle }),
  fc.record({ hood: fc.constant('enclosure'), openArea: amount(0.001, 20).map(squareMetres) }),
  fc.record({ hood: fc.constant('canopy'), perimeter: length }),
);

/** Any finite number at all, for what must never come out as no number. */
export const anyFinite = fc.double({ noNaN: true, noDefaultInfinity: true });
