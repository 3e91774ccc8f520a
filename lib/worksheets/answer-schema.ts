import { z } from 'zod';

export const stepSchema = z
  .strictObject({
    label: z.string(),
    equation: z.string().describe('with letters, then with the numbers of this question in SI'),
    value: z.number(),
    unit: z.string().describe('SI unit of value; empty for a ratio'),
    source: z.string().describe('where the equation is published, or that it is from memory'),
  })
  .meta({ id: 'Step' });

export const warningSchema = z
  .strictObject({ code: z.string().describe('stable, for machines'), text: z.string() })
  .meta({ id: 'Warning' });

/** The schema of an answer whose result has the given schema. */
export const answerOf = <R>(result: z.ZodType<R>) =>
  z.strictObject({ result, steps: z.array(stepSchema), warnings: z.array(warningSchema) });
