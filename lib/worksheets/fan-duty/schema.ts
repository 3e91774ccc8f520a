import { z } from 'zod';
import { answerOf } from '@/lib/worksheets/answer-schema';
import { circumstancesField } from '@/lib/worksheets/circumstances-schema';
import { ductSystem, hood, runs } from '@/lib/worksheets/duct-schema';
import { fan } from '@/lib/worksheets/fan-schema';
import { air, airflow, between, name, plain } from '@/lib/worksheets/parts-schema';

export const MAX_BRANCHES = 8;
/** One machine on a fan: its hood, its duct up to the common one, its gate. */
export const branch = z.strictObject({
  name,
  hood,
  runs: runs.max(4, 'at most 4 runs'),
  gate: z.enum(['open', 'shut']).optional(),
  leak: plain(0.0001, 1)
    .optional()
    .describe('what a shut gate lets through, as a share of the duct’s area; 0.02 unless told'),
  wanted: airflow.optional(),
  roomPressure: between('pressure', -500, 500).optional(),
});

export const fanDutyRequest = z
  .strictObject({
    fan,
    density: plain(0.3, 2).optional().describe('kg/m3 of the air; of `air`, or 1.204, unless told'),
    air: air.optional(),
    ...ductSystem,
    roomPressure: between('pressure', -2000, 2000).optional().describe('Pa against outdoors, negative below'),
    targetAirflow: airflow.optional(),
    branches: z
      .array(branch)
      .max(MAX_BRANCHES)
      .optional()
      .describe('machines on this fan; `runs` are then the common duct'),
    circumstances: circumstancesField,
  })
  .meta({ id: 'FanDutyRequest' });
export type FanDutyQuestion = z.infer<typeof fanDutyRequest>;

const points = z.array(z.strictObject({ airflow: z.number(), staticPressure: z.number() }));
const duty = z.strictObject({ airflow: z.number().describe('m3/s'), staticPressure: z.number().describe('Pa') });

export const fanDutyResult = z.strictObject({
  airflow: z.number().describe('m3/s where the fan meets its system; the lowest where there are several'),
  staticPressure: z.number().describe('Pa there'),
  speedForAirflow: z
    .number()
    .nullable()
    .optional()
    .describe('share of the curve’s speed that gives targetAirflow; null where none does'),
  loadedFilter: duty.optional().describe('the same with the filter loaded'),
  crossings: z.array(duty).describe('every stable meeting'),
  curves: z.strictObject({
    fan: points,
    system: points.describe('what hood, duct and filter ask for; of several machines, all of them together'),
    loaded: points.optional().describe('the system with the filter loaded'),
  }),
  branches: z
    .array(
      z.strictObject({
        name: z.string(),
        gate: z.enum(['open', 'shut']),
        airflow: z.number().describe('m3/s; negative comes out of the hood'),
        velocity: z.number().describe('m/s in its first run'),
        wanted: z.number().optional(),
        balancingLossFactor: z.number().optional().describe('C that its gate must add for all to draw what they want'),
      }),
    )
    .optional(),
});
export type FanDutyResult = z.infer<typeof fanDutyResult>;
export const fanDutyAnswer = answerOf(fanDutyResult).meta({ id: 'FanDutyAnswer' });
