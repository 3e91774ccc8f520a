import { z } from 'zod';
import { VENTS } from '@/lib/air/vent-limits';
import { answerOf } from '@/lib/worksheets/answer-schema';
import { circumstancesField } from '@/lib/worksheets/circumstances-schema';
import { ductSystem, hood, runs } from '@/lib/worksheets/duct-schema';
import { branch, MAX_BRANCHES } from '@/lib/worksheets/fan-duty/schema';
import { fan } from '@/lib/worksheets/fan-schema';
import { airflow, between, name, plain, volume } from '@/lib/worksheets/parts-schema';

export const MAX_EXHAUSTS = 20;
export const MAX_OPENINGS = 12;
export const MAX_APPLIANCES = 8;

/** An exhaust of which only the airflow is known, or a fan on its hood and duct. */
const exhaust = z
  .strictObject({
    name,
    airflow: airflow.optional(),
    fan: fan.optional(),
    ...ductSystem,
    hood: hood.optional(),
    runs: runs.optional(),
    branches: z
      .array(branch.omit({ roomPressure: true }))
      .max(MAX_BRANCHES)
      .optional()
      .describe('machines on this fan, all in this room; `runs` are then the common duct, and it has no hood'),
  })
  .superRefine((given, context) => {
    const fault = (path: string, message: string) => context.addIssue({ code: 'custom', path: [path], message });
    if (given.airflow !== undefined && given.fan)
      fault('airflow', 'give an airflow, or a fan with hood and runs, not both');
    else if (given.airflow === undefined && !given.fan)
      fault('airflow', 'is missing: an airflow, or a fan with hood and runs');
    if (given.fan && !given.hood && !given.branches?.length) fault('hood', 'is missing: a fan needs its hood');
    if (given.fan && !given.runs) fault('runs', 'is missing: a fan needs its duct');
  });

const opening = z.strictObject({
  area: between('area', 1e-6, 100),
  dischargeCoefficient: plain(0.1, 1).optional().describe('0.6 unless told'),
  height: between('length', 0, 30).optional().describe('m, of its middle above the floor'),
});

const leakage = z
  .strictObject({
    areaAt4Pa: between('area', 0, 20).optional().describe('m2, effective at 4 Pa'),
    ach50: plain(0, 200).optional().describe('air changes an hour at 50 Pa'),
  })
  .refine(({ areaAt4Pa, ach50 }) => (areaAt4Pa === undefined) !== (ach50 === undefined), {
    ...{ path: ['areaAt4Pa'], message: 'give a leakage area, or air changes at 50 Pa, and not both' },
  });

const appliance = z.strictObject({
  name,
  vent: z.enum(VENTS),
  flueHeight: between('length', 0, 100).optional().describe('m, from the appliance to the top'),
  flueTemperature: between('temperature', -50, 1200).optional().describe('°C, mean; a cold flue unless told'),
});

export const roomBalanceRequest = z
  .strictObject({
    room: z.strictObject({ volume, height: between('length', 1, 30).optional() }),
    air: z.strictObject({
      indoor: between('temperature', -30, 60),
      outdoor: between('temperature', -60, 60),
      altitude: between('length', -430, 9000).optional(),
    }),
    exhausts: z.array(exhaust).max(MAX_EXHAUSTS),
    makeUp: z.strictObject({
      supply: between('airflow', 0, 50).optional().describe('m3/s of outdoor air blown in'),
      openings: z.array(opening).max(MAX_OPENINGS).optional(),
      leakage: leakage.optional(),
    }),
    appliances: z.array(appliance).max(MAX_APPLIANCES).optional(),
    circumstances: circumstancesField,
  })
  .meta({ id: 'RoomBalanceRequest' });
export type RoomBalanceQuestion = z.infer<typeof roomBalanceRequest>;

const flow = z.number().describe('m3/s at the density of the room');

export const roomBalanceResult = z.strictObject({
  roomPressure: z.number().describe('Pa against outdoors at the floor; negative is below'),
  exhausts: z.array(
    z.strictObject({
      ...{ name: z.string(), airflow: flow, wanted: flow },
      branches: z
        .array(z.strictObject({ name: z.string(), gate: z.enum(['open', 'shut']), airflow: flow }))
        .optional()
        .describe('how its machines share it; negative comes out of the hood'),
    }),
  ),
  makeUp: z.strictObject({ supply: flow, openings: flow, leakage: flow, total: flow }),
  shortfall: z.number().describe('m3/s that all exhausts together get less than each would have with the room open'),
  airChangesPerHour: z.number(),
  appliances: z.array(
    z.strictObject({
      name: z.string(),
      limit: z.number().describe('Pa against outdoors that the room must not go below'),
      draught: z.number().nullable().describe('Pa that its flue pulls; null where its height is not known'),
      spills: z.boolean().describe('the room pulls harder than its flue, or is beyond its limit'),
      beyondLimit: z.boolean().optional().describe('the room is below the limit of its kind of vent'),
    }),
  ),
  heat: z.number().describe('W that bring the air let in to the temperature of the room; negative cools'),
  openingNeeded: z
    .number()
    .nullable()
    .describe(
      'm2 of further free opening that would hold the room at its strictest limit, the draught of its weakest flue, or 5 Pa below; null where the room is held. A flue that pulls nothing is helped by none',
    ),
});
export type RoomBalanceResult = z.infer<typeof roomBalanceResult>;
export const roomBalanceAnswer = answerOf(roomBalanceResult).meta({ id: 'RoomBalanceAnswer' });
