import { z } from 'zod';
import { MAX_MATERIALS as MAX_LAYERS } from '@/lib/check/schema';
import { planSchema } from './plan-schema';

const slug = z.string().trim().min(1, 'is missing').max(80);

/** “Does mine cope?”: a workshop, one of its stations, and the pair that is asked. */
export const copeRequest = z
  .strictObject({
    workshop: planSchema,
    station: z.string().trim().min(1, 'is missing').max(60),
    material: z.array(slug).min(1, 'at least one material').max(MAX_LAYERS),
    process: slug.optional().describe('the one of the station unless told'),
  })
  .meta({ id: 'CopeRequest' });

const flow = z.number().describe('m3/s');
export const copeAnswer = z
  .strictObject({
    materials: z.array(z.string()),
    process: z.string(),
    station: z.string(),
    control: z.string(),
    verdict: z.enum(['meets', 'falls short', 'cannot be judged', 'prohibited', 'unknown']),
    text: z.string(),
    why: z.array(z.string()),
    needed: flow.optional(),
    delivered: flow.optional().describe('m3/s with everything in the room on'),
    alone: flow.optional().describe('m3/s with this exhaust alone'),
    roomPressure: z.number().optional().describe('Pa against outdoors'),
    spills: z.array(z.string()).optional().describe('flued appliances that are beaten'),
    clearing: z.number().optional().describe('s to one hundredth, mixing factor 3'),
    limiting: z.string().optional(),
    fixes: z.array(z.strictObject({ code: z.string(), part: z.string(), text: z.string(), share: z.number() })),
    assumptions: z.array(z.string()),
  })
  .meta({ id: 'CopeAnswer' });
export type CopeQuestion = z.infer<typeof copeRequest>;
export type CopeAnswer = z.infer<typeof copeAnswer>;

export const matrixRequest = z.strictObject({ workshop: planSchema }).meta({ id: 'MatrixRequest' });
export const matrixAnswer = z
  .strictObject({
    materials: z.array(z.strictObject({ slug: z.string(), title: z.string() })),
    rows: z.array(
      z.strictObject({
        station: z.string(),
        process: z.string(),
        processTitle: z.string(),
        cells: z.array(copeAnswer),
      }),
    ),
  })
  .meta({ id: 'MatrixAnswer' });
export type MatrixAnswer = z.infer<typeof matrixAnswer>;
