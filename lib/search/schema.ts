import { z } from 'zod';
import { one } from '@/lib/api/read-query';
import { DEFAULT_HITS, MAX_HITS, MAX_QUERY_CHARACTERS } from './limits';
import { SEARCH_KINDS } from './search';

const absent = z.undefined();
const limit = z
  .string()
  .regex(/^\d{1,3}$/, 'must be a whole number')
  .transform(Number)
  .refine((value) => value >= 1 && value <= MAX_HITS, `must be 1 to ${MAX_HITS}`);

/** A search as asked over the API. */
export const searchQuestion = z.strictObject({
  q: one(z.string('is missing').max(MAX_QUERY_CHARACTERS, `must be at most ${MAX_QUERY_CHARACTERS} characters`)),
  kind: one(z.enum(SEARCH_KINDS).or(absent)).optional(),
  limit: one(limit.or(absent).transform((value) => value ?? DEFAULT_HITS)).optional(),
});
