import fc from 'fast-check';
import { CIRCUMSTANCES } from '@/lib/worksheets/circumstances';
import { LEAST, type DilutionQuestion } from '@/lib/worksheets/dilution/schema';

/** Amounts over all the decades that are admitted. */
const decades = (most: number) =>
  fc
    .double({ min: Math.log10(LEAST), max: Math.log10(most), noNaN: true })
    .map((power) => Math.min(most, Math.max(LEAST, 10 ** power)));
const molarMass = fc.double({ min: 1, max: 2000, noNaN: true });

/** Every kind of admitted question: a mass or a liquid, against ppm or mg/m3. */
export const questions: fc.Arbitrary<DilutionQuestion> = fc.record({
  generation: fc.oneof(
    fc.record({ massRate: decades(1e7) }),
    fc.record({ liquidRate: decades(1e4), specificGravity: decades(20), molarMass }),
  ),
  limit: fc.record({ value: decades(1e6), unit: fc.constantFrom('ppm', 'mg/m3') }),
  molarMass,
  mixingFactor: fc.double({ min: 1, max: 10, noNaN: true }),
  circumstances: fc.subarray([...CIRCUMSTANCES]),
});
