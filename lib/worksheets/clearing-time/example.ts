import type { ClearingTimeQuestion } from './schema';

/** A question to look at before one's own. The room is invented. */
export const CLEARING_TIME_EXAMPLE: ClearingTimeQuestion = {
  volume: 62,
  airflow: 0.16,
  mixingFactor: 3,
  removal: 0.99,
};
