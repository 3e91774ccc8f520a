import { z } from 'zod';
import { answerOf } from '@/lib/worksheets/answer-schema';
import { circumstancesField } from '@/lib/worksheets/circumstances-schema';
import { limitSchema } from '@/lib/worksheets/limit-schema';

export const MAX_ITEMS = 12;
export const BASES = ['TWA', 'STEL', 'ceiling', 'IDLH'] as const;

const item = z.strictObject({
  substance: z
    .string()
    .regex(/^[a-z0-9]+(?:-[a-z0-9]+)*$/, 'must be an address in the library, such as toluene')
    .max(80),
  value: z.number().min(0, 'must be at least 0').max(1e9, 'must be at most 1000000000'),
  unit: z.enum(['ppm', 'mg/m3']),
});

export const exposureRequest = z
  .strictObject({
    items: z.array(item).min(1, 'at least one substance').max(MAX_ITEMS, `at most ${MAX_ITEMS} substances`),
    basis: z.enum(BASES),
    authority: z.string().min(1).max(40).optional().describe('the strictest in force unless told'),
    circumstances: circumstancesField,
  })
  .meta({
    id: 'ExposureRequest',
    examples: [{ items: [{ substance: 'toluene', value: 40, unit: 'ppm' }], basis: 'TWA', authority: 'OSHA' }],
  });
export type ExposureQuestion = z.infer<typeof exposureRequest>;

export const exposureResult = z.strictObject({
  sum: z.number().describe('of the shares; above 1 the mixture is over, where effects add'),
  items: z.array(
    z.strictObject({
      substance: z.string(),
      ratio: z.number(),
      limit: limitSchema,
    }),
  ),
  within: z.boolean().describe('whether the sum is at most 1: a statement about the sum, not about harm'),
});
export type ExposureResult = z.infer<typeof exposureResult>;
export const exposureAnswer = answerOf(exposureResult).meta({ id: 'ExposureAnswer' });
