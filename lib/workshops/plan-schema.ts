import { z } from 'zod';
import { HOODS } from '@/lib/air/hood-airflow';
import { VENTS } from '@/lib/air/vent-limits';
import { between, MAX_NAME, plain } from '@/lib/worksheets/parts-schema';
import { runs } from '@/lib/worksheets/duct-schema';
import { fan } from '@/lib/worksheets/fan-schema';

/** Limits on one workshop. */
export const MAX_ROOMS = 8;
export const MAX_EXHAUSTS = 12;
export const MAX_STATIONS = 16;
export const MAX_MATERIALS = 24;
export const MAX_READINGS = 120;

const name = z.string().trim().max(MAX_NAME, `must be at most ${MAX_NAME} characters`).optional();
const slug = z.string().trim().max(80).optional();
const length = (max = 30) => between('length', 0, max).optional();
const temperature = between('temperature', -60, 200).optional();
const airflow = between('airflow', 1e-5, 50).optional();
const loss = between('pressure', 0, 20_000).optional();

const room = z.strictObject({
  name,
  volume: between('volume', 0.5, 100_000).optional(),
  height: between('length', 1, 30).optional(),
  supply: between('airflow', 0, 50).optional().describe('m3/s of outdoor air blown in'),
  openings: z
    .array(z.strictObject({ area: between('area', 1e-6, 100).optional(), height: length() }))
    .max(8)
    .optional(),
  ach50: plain(0, 200).optional().describe('air changes an hour at 50 Pa'),
  appliances: z
    .array(
      z.strictObject({
        name,
        vent: z.enum(VENTS).optional(),
        flueHeight: length(100),
        flueTemperature: between('temperature', -50, 1200).optional(),
      }),
    )
    .max(6)
    .optional(),
});

const exhaust = z.strictObject({
  name,
  room: name,
  airflow: airflow.describe('m3/s, where no curve is at hand'),
  fan: fan.optional(),
  entryLossFactor: plain(0, 100).optional(),
  runs: runs.optional(),
  filter: z.strictObject({ clean: loss, loaded: loss, at: airflow }).optional(),
  outletLossFactor: plain(0, 100).optional(),
});

const station = z.strictObject({
  name,
  exhaust: name,
  process: slug,
  hood: z.enum(HOODS).optional(),
  distance: length(20),
  diameter: length(20),
  width: length(20),
  height: length(20),
  openArea: between('area', 0, 400).optional(),
  perimeter: length(80),
  runs: runs.optional().describe('its own duct up to a common one; the exhaust’s runs are then the common duct'),
});

export const READINGS = ['face-velocity', 'static-pressure'] as const;
const reading = z.strictObject({
  exhaust: name,
  kind: z.enum(READINGS).optional(),
  date: z
    .string()
    .regex(/^\d{4}-\d\d-\d\d$/, 'must be a date such as 2026-12-01')
    .optional(),
  who: name,
  velocity: between('velocity', 0, 60).optional(),
  pressure: between('pressure', 0, 20_000).optional(),
});

/** A workshop as it is being written: every part may still be missing. */
export const planSchema = z
  .strictObject({
    name,
    climate: z
      .strictObject({ indoor: temperature, outdoor: temperature, altitude: between('length', -430, 9000).optional() })
      .optional(),
    rooms: z.array(room).max(MAX_ROOMS).optional(),
    exhausts: z.array(exhaust).max(MAX_EXHAUSTS).optional(),
    stations: z.array(station).max(MAX_STATIONS).optional(),
    materials: z
      .array(z.strictObject({ material: slug }))
      .max(MAX_MATERIALS)
      .optional(),
    readings: z.array(reading).max(MAX_READINGS).optional(),
    checkEvery: plain(1, 36).optional().describe('months between two readings'),
  })
  .meta({ id: 'WorkshopPlan' });

export type Plan = z.infer<typeof planSchema>;
export type PlanRoom = NonNullable<Plan['rooms']>[number];
export type PlanExhaust = NonNullable<Plan['exhausts']>[number];
export type PlanStation = NonNullable<Plan['stations']>[number];
export type PlanReading = NonNullable<Plan['readings']>[number];
