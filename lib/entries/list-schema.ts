import { z } from 'zod';
import { one } from '@/lib/api/read-query';
import { DEFAULT_LISTED, keyOfCursor, MAX_LISTED } from './list-entries';
import { KINDS } from './vocabulary';

const absent = z.undefined();

/** A list of entries as asked over the API. */
export const listQuestion = z.strictObject({
  kind: one(z.enum(KINDS).or(absent)).optional(),
  updatedSince: one(
    z.iso
      .datetime({ offset: true, message: 'must be a date and time, like 2026-01-31T00:00:00Z' })
      .or(z.iso.date())
      .transform((text) => new Date(text))
      .or(absent),
  ).optional(),
  cursor: one(
    z
      .string()
      .max(200)
      .refine((text) => keyOfCursor(text) !== undefined, 'is not a cursor of this list')
      .or(absent),
  ).optional(),
  limit: one(
    z
      .string()
      .regex(/^\d{1,3}$/, 'must be a whole number')
      .transform(Number)
      .refine((value) => value >= 1 && value <= MAX_LISTED, `must be 1 to ${MAX_LISTED}`)
      .or(absent),
  )
    .optional()
    .transform((value) => value ?? DEFAULT_LISTED),
});

/** One entry as asked over the API: `revision` names an earlier published one. */
export const entryQuestion = z.strictObject({
  revision: one(
    z
      .string()
      .regex(/^[1-9]\d{0,5}$/, 'must be a whole number from 1')
      .transform(Number)
      .or(absent),
  ).optional(),
});
