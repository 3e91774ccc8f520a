import { z } from 'zod';
import { CARRIED } from '@/lib/air/transport-velocity';
import { answerOf } from '@/lib/worksheets/answer-schema';
import { circumstancesField } from '@/lib/worksheets/circumstances-schema';
import { ductSystem, runResult } from '@/lib/worksheets/duct-schema';
import { air, airflow } from '@/lib/worksheets/parts-schema';

export const ductPressureRequest = z
  .strictObject({
    airflow,
    air: air.optional(),
    ...ductSystem,
    carries: z.enum(CARRIED).optional().describe('what must not settle in the duct'),
    circumstances: circumstancesField,
  })
  .meta({
    id: 'DuctPressureRequest',
    examples: [
      {
        airflow: 0.14,
        hood: { entryLossFactor: 0.49 },
        runs: [
          { duct: 'galvanised-steel', diameter: 0.125, length: 8, fittings: [{ fitting: 'elbow-90-r1.5', count: 4 }] },
        ],
      },
    ],
  });
export type DuctPressureQuestion = z.infer<typeof ductPressureRequest>;

export const ductPressureResult = z.strictObject({
  staticPressure: z.number().describe('Pa: the rise from inlet to outlet that the fan must give'),
  fanStaticPressure: z.number().describe('Pa: the same less the velocity pressure, as fan catalogues define it'),
  hoodStaticPressure: z.number().describe('Pa of suction just behind the hood'),
  runs: z.array(runResult),
  filter: z.number().describe('Pa, clean'),
  outlet: z.number().describe('Pa'),
  loadedStaticPressure: z.number().optional().describe('Pa, with the filter loaded'),
});
export type DuctPressureResult = z.infer<typeof ductPressureResult>;
export const ductPressureAnswer = answerOf(ductPressureResult).meta({ id: 'DuctPressureAnswer' });
