import fc from 'fast-check';
import { CIRCUMSTANCES } from '@/lib/worksheets/circumstances';
import type { ClearingTimeQuestion } from '@/lib/worksheets/clearing-time/schema';
import { LEAST } from '@/lib/worksheets/dilution/schema';
import { MAX_AIRFLOW, MAX_VOLUME, MIN_AIRFLOW } from '@/lib/worksheets/parts-schema';

/** Amounts over all the decades that are admitted. */
const decades = (least: number, most: number) =>
  fc
    .double({ min: Math.log10(least), max: Math.log10(most), noNaN: true })
    .map((power) => Math.min(most, Math.max(least, 10 ** power)));
const concentration = decades(LEAST, 1e9);
const source = { massRate: decades(LEAST, 1e7), duration: decades(LEAST, 1e7) };

/** The three ways to say what counts as clear; after a source with and without a concentration to reach. */
export const sourceGoals = fc.record({ ...source, to: concentration }, { requiredKeys: ['massRate', 'duration'] });
const goals = fc.oneof(
  fc.double({ min: 1e-9, max: 1 - 1e-9, noNaN: true }).map((removal) => ({ removal })),
  fc
    .tuple(concentration, concentration)
    .filter(([a, b]) => a !== b)
    .map(([a, b]) => ({ from: Math.max(a, b), to: Math.min(a, b) })),
  sourceGoals,
);

const rooms = fc.record(
  {
    volume: decades(0.001, MAX_VOLUME),
    airflow: decades(MIN_AIRFLOW, MAX_AIRFLOW),
    mixingFactor: fc.double({ min: 1, max: 10, noNaN: true }),
    cleanAir: fc.double({ min: 0, max: MAX_AIRFLOW, noNaN: true }),
    circumstances: fc.subarray([...CIRCUMSTANCES]),
  },
  { requiredKeys: ['volume', 'airflow'] },
);

export const questions: fc.Arbitrary<ClearingTimeQuestion> = fc
  .tuple(rooms, goals)
  .map(([room, goal]) => ({ ...room, ...goal }));
