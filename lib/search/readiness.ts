import 'server-only';
import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { connection } from '@/lib/database';
import { log } from '@/lib/log';
import { type Outcome, done, refuse } from '@/lib/outcome';
import { liveLibrary } from './live-library';

type Ready = { libraryVersion: number; entries: number };

const notReady = (detail: string) => refuse(503, 'Not ready', detail);

/** Ready when the database answers, its migrations are those of this build, and the library and its index are loaded. */
export async function readiness(): Promise<Outcome<Ready>> {
  const wanted = readdirSync(join(process.cwd(), 'db/migrations')).filter((name) => name.endsWith('.ts'));
  let applied: string[];
  try {
    applied = await connection()('knex_migrations').pluck('name');
  } catch (error) {
    log.warn({ reason: (error as Error).message }, 'database not ready');
    return notReady('The database does not answer, or was never migrated.');
  }
  const missing = wanted.filter((name) => !applied.includes(name));
  if (missing.length > 0) return notReady(`The database lacks ${missing.length} migrations.`);
  if (applied.length > wanted.length) return notReady('The database is of a newer version than this program.');
  const { library } = await liveLibrary();
  if (library.entries.length === 0) return notReady('The library is empty: run the seed.');
  return done({ libraryVersion: library.version, entries: library.entries.length });
}
