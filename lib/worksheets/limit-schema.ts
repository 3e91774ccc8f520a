import { z } from 'zod';

/** A limit of the library as a result states it. */
export const limitSchema = z.strictObject({
  authority: z.string(),
  basis: z.string(),
  value: z.number(),
  unit: z.string(),
  source: z.string().describe('id of the source'),
  provenance: z.string().describe('published, common practice or from memory'),
});
