import { z } from 'zod';
import { CIRCUMSTANCES } from './circumstances';

/** The field of a question that says what is true of the room and the work. */
export const circumstancesField = z
  .array(z.enum(CIRCUMSTANCES))
  .max(CIRCUMSTANCES.length)
  .optional()
  .describe('what is true of the room and the work: each leads the answer with a caution');
