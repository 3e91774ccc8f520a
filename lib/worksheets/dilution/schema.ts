import { z } from 'zod';
import { MIXING } from '@/lib/air/mixing';
import { answerOf } from '@/lib/worksheets/answer-schema';
import { circumstancesField } from '@/lib/worksheets/circumstances-schema';
import { plain } from '@/lib/worksheets/parts-schema';

/** Smaller than any amount that could be meant. */
export const LEAST = 1e-9;
export const above = (max: number) => plain(LEAST, max);
export const molarMass = z.number().min(1, 'must be at least 1').max(2000, 'must be at most 2000').describe('g/mol');
export const mixingFactor = plain(MIXING.best, MIXING.worst).describe(
  'K: 1 perfect, 10 very poor; it multiplies the airflow',
);
export const MASS_AND_LIQUID = ['massRate', 'liquidRate', 'specificGravity', 'molarMass'] as const;

const generation = z
  .strictObject({
    massRate: above(1e7).optional().describe('mg/s'),
    liquidRate: above(1e4).optional().describe('L/h of liquid that evaporates'),
    specificGravity: above(20).optional(),
    molarMass: molarMass.optional(),
  })
  .superRefine((given, context) => {
    const fault = (path: string, message: string) => context.addIssue({ code: 'custom', path: [path], message });
    const liquid = MASS_AND_LIQUID.slice(1).filter((each) => given[each] !== undefined);
    if (given.massRate !== undefined && liquid.length > 0) fault(liquid[0]!, 'give a release, or a liquid, not both');
    if (given.massRate === undefined && liquid.length === 0)
      fault('massRate', 'is missing: a release, or a liquid that evaporates');
    if (given.massRate === undefined && liquid.length > 0)
      for (const each of MASS_AND_LIQUID.slice(1))
        if (given[each] === undefined) fault(each, 'is missing: a liquid needs it');
  });

export const dilutionRequest = z
  .strictObject({
    generation,
    limit: z.strictObject({ value: above(1e6), unit: z.enum(['ppm', 'mg/m3']) }),
    molarMass: molarMass.optional().describe('g/mol of the vapour, where a mass meets a limit in ppm'),
    mixingFactor,
    circumstances: circumstancesField,
  })
  .superRefine(({ generation: of, limit, molarMass: given }, context) => {
    if (limit.unit === 'ppm' && of.massRate !== undefined && given === undefined)
      context.addIssue({ code: 'custom', path: ['molarMass'], message: 'is missing: a limit in ppm needs it' });
  })
  .meta({
    id: 'DilutionRequest',
    examples: [{ generation: { massRate: 5 }, limit: { value: 50, unit: 'mg/m3' }, mixingFactor: 3 }],
  });
export type DilutionQuestion = z.infer<typeof dilutionRequest>;

export const dilutionResult = z.strictObject({
  airflow: z.number().describe('m3/s of clean air, spread over the room'),
  perfectMixing: z.number().describe('m3/s that would do with K = 1'),
});
export type DilutionResult = z.infer<typeof dilutionResult>;
export const dilutionAnswer = answerOf(dilutionResult).meta({ id: 'DilutionAnswer' });
