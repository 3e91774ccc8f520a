import fc from 'fast-check';
import { WORK } from '@/lib/worksheets/hood-airflow/fields';
import type { HoodQuestion } from '@/lib/worksheets/hood-airflow/schema';

const amount = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const length = amount(0.001, 20);
const common = { velocity: amount(0.01, 25), work: fc.subarray([...WORK]) };
const slot = fc.tuple(length, length).map(([a, b]) => ({ width: Math.max(a, b), height: Math.min(a, b) }));

const opening = fc.constantFrom('plain-opening', 'flanged-opening', 'bench-opening');
const away = { ...common, distance: length };

/** Every question the schema admits, over its whole range. */
export const questions: fc.Arbitrary<HoodQuestion> = fc.oneof(
  fc.record({ ...away, hood: opening, diameter: length }),
  fc.record({ ...away, hood: opening, width: length, height: length }),
  fc
    .tuple(fc.record({ ...away, hood: fc.constantFrom('plain-slot', 'flanged-slot') }), slot)
    .map(([a, b]) => ({ ...a, ...b })),
  fc.record({ ...common, hood: fc.constant('enclosure'), openArea: amount(0.000_01, 400) }),
  fc.record({ ...away, hood: fc.constant('canopy'), perimeter: amount(0.001, 80) }),
);
