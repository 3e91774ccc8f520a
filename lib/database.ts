import 'server-only';
import type { Knex } from 'knex';
import { knexInstance } from '@/db/connection';

/** The one door to db/: a pool, or a transaction taken from it. */
export type Connection = Knex;

export const connection = (): Connection => knexInstance();

/** Deadlock, lock wait, and a row that changed under a snapshot: the whole transaction may simply be done again. */
const RETRYABLE = new Set([1213, 1205, 1020]);
const TRIES = 5;

const pause = () => new Promise((resolve) => setTimeout(resolve, 20 + Math.random() * 380));

/**
 * Runs `work` in one transaction, again from the start when MariaDB asks for it. A connection lost during a commit is never tried
 * again blindly: it is not known whether the commit happened.
 */
export async function inTransaction<T>(work: (transaction: Connection) => Promise<T>, on = connection()): Promise<T> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await on.transaction(work);
    } catch (error) {
      if (attempt >= TRIES || !RETRYABLE.has((error as { errno?: number }).errno ?? 0)) throw error;
      await pause();
    }
  }
}
