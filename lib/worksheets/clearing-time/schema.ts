import { z } from 'zod';
import { answerOf } from '@/lib/worksheets/answer-schema';
import { circumstancesField } from '@/lib/worksheets/circumstances-schema';
import { above, mixingFactor } from '@/lib/worksheets/dilution/schema';
import { airflow, between, MAX_AIRFLOW, volume } from '@/lib/worksheets/parts-schema';

export const clearingTimeRequest = z
  .strictObject({
    volume,
    airflow,
    mixingFactor: mixingFactor.optional(),
    cleanAir: between('airflow', 0, MAX_AIRFLOW)
      .optional()
      .describe('m3/s that a filter gives besides (CADR), of what is to be cleared'),
    removal: z
      .number()
      .gt(0, 'must be above 0')
      .max(1 - 1e-9, 'must be below 1: nothing is ever wholly gone')
      .optional(),
    from: above(1e9).optional().describe('concentration, in the unit of `to`'),
    to: above(1e9).optional().describe('concentration to reach; mg/m3 after a source'),
    massRate: above(1e7).optional().describe('mg/s while it ran'),
    duration: above(1e7).optional().describe('s that it ran'),
    circumstances: circumstancesField,
  })
  .superRefine((given, context) => {
    const fault = (path: string, message: string) => context.addIssue({ code: 'custom', path: [path], message });
    const source = given.massRate !== undefined || given.duration !== undefined;
    const named = [given.removal !== undefined, given.from !== undefined, source].filter(Boolean).length;
    if (named === 0) fault('removal', 'is missing: a share, or two concentrations, or a source and how long it ran');
    if (named > 1)
      fault(
        given.removal !== undefined ? 'removal' : 'from',
        'give a share, or two concentrations, or a source: one of them',
      );
    if (given.from !== undefined && given.to === undefined) fault('to', 'is missing: the concentration to reach');
    if (given.from !== undefined && given.to !== undefined && given.to >= given.from)
      fault('to', 'must be below the one it starts from');
    if (given.to !== undefined && given.from === undefined && !source)
      fault('from', 'is missing: the concentration it starts from');
    if (source && given.massRate === undefined) fault('massRate', 'is missing: a source needs its release');
    if (source && given.duration === undefined) fault('duration', 'is missing: a source needs how long it ran');
  })
  .meta({ id: 'ClearingTimeRequest', examples: [{ volume: 52, airflow: 0.2778, mixingFactor: 3, removal: 0.99 }] });
export type ClearingTimeQuestion = z.infer<typeof clearingTimeRequest>;

const point = z.strictObject({ time: z.number().describe('s from the end of any source'), fraction: z.number() });
export const clearingTimeResult = z.strictObject({
  time: z.number().describe('s until it is reached, from the end of any source'),
  airChanges: z.number().describe('an hour, of the airflow alone'),
  equivalentAirChanges: z.number().optional().describe('an hour, with what a filter gives'),
  curve: z.array(point).describe('share of the concentration at the start, or of the highest after a source'),
  curvePerfect: z.array(point).describe('the same from the same start with K = 1'),
  perfectMixing: z.number().describe('s with K = 1 from the same start'),
  peak: z.number().optional().describe('mg/m3 at the end of the source'),
  steady: z.number().optional().describe('mg/m3 that the source would come to if it never ended'),
  buildUp: z.array(point).optional().describe('share of the highest while the source ran; its times are negative'),
});
export type ClearingTimeResult = z.infer<typeof clearingTimeResult>;
export const clearingTimeAnswer = answerOf(clearingTimeResult).meta({ id: 'ClearingTimeAnswer' });
