import 'server-only';
import type { Knex } from 'knex';
import { knexInstance } from '@/db/connection';
import { env } from '@/lib/env';

/** The one door to db/: the pool, or a transaction taken from it (a Knex.Transaction is a Knex). */
export type Connection = Knex;

export function connection(): Connection {
  const { DATABASE_URL, DATABASE_POOL_MAX } = env();
  return knexInstance(DATABASE_URL, DATABASE_POOL_MAX);
}

/** Deadlock, lock wait, and a row that changed under a snapshot: the whole transaction may simply be done again. */
const RETRYABLE = new Set([1213, 1205, 1020]);
const TRIES = 5;

const pause = () => new Promise((resolve) => setTimeout(resolve, 20 + Math.random() * 380));

/** What MariaDB says of it; a connection that was lost says nothing, so it is never in the set. */
const mayBeDoneAgain = (error: unknown) => RETRYABLE.has((error as { errno?: number } | null)?.errno ?? 0);

/**
 * Runs `work` in one transaction, again from the start when MariaDB asks for it, so `work` must do nothing outside the database.
 * Given a transaction, it takes part in that one: only the outermost may begin again. A connection lost during a commit is never
 * tried again blindly, since it is not known whether the commit happened.
 */
export async function inTransaction<T>(work: (transaction: Connection) => Promise<T>, on = connection()): Promise<T> {
  if (on.isTransaction) return work(on);
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await on.transaction(work);
    } catch (error) {
      if (attempt >= TRIES || !mayBeDoneAgain(error)) throw error;
      await pause();
    }
  }
}
