import { z } from 'zod';
import { MAX_FORMULA } from '@/lib/chemistry/formula';
import { answerOf } from '@/lib/worksheets/answer-schema';
import { circumstancesField } from '@/lib/worksheets/circumstances-schema';
import { limitSchema } from '@/lib/worksheets/limit-schema';
import { airflow, between, plain, volume } from '@/lib/worksheets/parts-schema';

const slug = z
  .string()
  .regex(/^[a-z0-9]+(?:-[a-z0-9]+)*$/, 'must be an address in the library, such as pvc')
  .max(80);

export const releaseRequest = z
  .strictObject({
    material: slug.optional(),
    formula: z.string().min(1).max(MAX_FORMULA).optional().describe('of the repeat unit'),
    cut: z
      .strictObject({
        length: between('length', 0, 100_000),
        kerf: between('length', 0, 0.1),
        thickness: between('length', 0, 1),
        density: plain(1, 25_000).optional().describe('kg/m3; the highest the library states unless told'),
      })
      .optional(),
    massLost: plain(0, 1e6).optional().describe('g'),
    room: z.strictObject({ volume, airflow: airflow.optional() }).optional(),
    circumstances: circumstancesField,
  })
  .superRefine(({ material, formula, cut, massLost }, context) => {
    const fault = (path: string, message: string) => context.addIssue({ code: 'custom', path: [path], message });
    if (material === undefined && formula === undefined) fault('material', 'is missing: a material, or a formula');
    if (material !== undefined && formula !== undefined) fault('formula', 'give a material, or a formula, not both');
    if (cut === undefined && massLost === undefined) fault('massLost', 'is missing: a mass, or a cut');
    if (cut !== undefined && massLost !== undefined) fault('massLost', 'give a mass, or a cut, not both');
  })
  .meta({
    id: 'ReleaseRequest',
    examples: [{ material: 'pvc', cut: { length: 2, kerf: 0.0002, thickness: 0.003 }, room: { volume: 60 } }],
  });
export type ReleaseQuestion = z.infer<typeof releaseRequest>;

export const releaseResult = z.strictObject({
  massLost: z.number().describe('g'),
  elements: z.array(
    z.strictObject({ symbol: z.string(), massFraction: z.number().describe('at most, where only shares are known') }),
  ),
  releases: z.array(
    z.strictObject({
      substance: z.string().describe('slug'),
      name: z.string(),
      massAtMost: z.number().describe('g'),
      concentrationAtMost: z
        .strictObject({ value: z.number(), unit: z.string() })
        .optional()
        .describe('all at once, evenly in the room'),
      ppmAtMost: z.number().optional().describe('at 25 °C'),
      ofLimit: z.number().optional().describe('times the limit'),
      limit: limitSchema.optional().describe('the strictest short one in force, or else of a shift'),
      timeToLimit: z
        .number()
        .optional()
        .describe('s of this airflow with perfect mixing until it is down to the limit'),
    }),
  ),
});
export type ReleaseResult = z.infer<typeof releaseResult>;
export const releaseAnswer = answerOf(releaseResult).meta({ id: 'ReleaseAnswer' });
