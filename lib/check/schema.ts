import { z } from 'zod';

export const MAX_MATERIALS = 6;
export const MAX_NAME = 80;

const name = z.string().trim().min(1, 'must not be empty').max(MAX_NAME, `must be at most ${MAX_NAME} characters`);

/** A check as asked: at least one material, one process, by slug. */
export const checkQuestion = z.strictObject({
  material: z.array(name).min(1, 'name at least one material').max(MAX_MATERIALS, `at most ${MAX_MATERIALS} materials`),
  process: z.array(name).length(1, 'name one process'),
});
