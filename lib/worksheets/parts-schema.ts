import { z } from 'zod';
import type { Kind } from '@/lib/units/kinds';
import { toldBoth } from '@/lib/units/show';

/** A number of a quantity between two limits in SI, each told in both systems. */
export const between = (kind: Kind, min: number, max: number) =>
  z
    .number()
    .min(min, `must be at least ${min === 0 ? '0' : toldBoth(kind, min)}`)
    .max(max, `must be at most ${toldBoth(kind, max)}`);

/** A number without a unit between two limits. */
export const plain = (min: number, max: number) =>
  z.number().min(min, `must be at least ${min}`).max(max, `must be at most ${max}`);

export const MAX_NAME = 60;
export const name = z.string().trim().min(1, 'is missing').max(MAX_NAME, `must be at most ${MAX_NAME} characters`);

export const MIN_AIRFLOW = 1e-5;
export const MAX_AIRFLOW = 50;
export const airflow = between('airflow', MIN_AIRFLOW, MAX_AIRFLOW);
export const MAX_PRESSURE = 20_000;
export const pressure = between('pressure', 0, MAX_PRESSURE);
export const MAX_VOLUME = 100_000;
export const volume = between('volume', 0.001, MAX_VOLUME);

/** Air by temperature and altitude; 20 °C at sea level where nothing is said. */
export const air = z
  .strictObject({
    temperature: between('temperature', -50, 200).optional(),
    altitude: between('length', -430, 9000).optional(),
  })
  .describe('°C and m: of the air in the duct');
