import { run } from './children.mjs';
import { ROOT, shown } from './root.mjs';
import { lastLine, Trouble } from './trouble.mjs';

/**
 * @typedef {import('./database.mjs').Database} Database
 * @typedef {import('./data-folder.mjs').Place} Place
 */

const TYPESCRIPT = ['--conditions=react-server', '--import', 'tsx'];

/**
 * The program never learns the password that may change tables: Next reads .env by itself, but leaves alone what is set, even to nothing.
 * @param {Database} database
 */
export const programEnv = (database) => ({
  DATABASE_URL: database.url,
  MIGRATION_DATABASE_URL: '',
  NEXT_TELEMETRY_DISABLED: '1',
});

/**
 * Changes the shape of the database: `latest`, `rollback` or `unlock`. Let finish even when asked to stop: MariaDB keeps half a change.
 * @param {Place} place @param {Database} database @param {string} job @returns {Promise<string>} what was done
 */
export async function migrate(place, database, job) {
  const log = place.log('migrate');
  const env = {
    MIGRATION_DATABASE_URL: database.migrateUrl,
    DATABASE_URL: database.migrateUrl,
    FUMELORE_OURS: database.ours ? 'yes' : '',
  };
  const args = [...TYPESCRIPT, `${ROOT}/scripts/lib/migrate-job.mjs`, job];
  const { code, text } = await run('migrations', process.execPath, args, {
    log,
    env,
    out: 'text',
    patient: true,
    grace: 120,
  });
  if (code !== 0) throw new Trouble(lastLine(text) || `The tables could not be changed; see ${shown(log)}.`);
  return lastLine(text);
}

/** Takes up the starter library. @param {Place} place @param {Database} database @returns {Promise<string>} what was done */
export async function takeUpLibrary(place, database) {
  const log = place.log('seed');
  const args = [...TYPESCRIPT, 'scripts/seed.ts'];
  const { code, text } = await run('seed', process.execPath, args, { log, env: programEnv(database), out: 'text' });
  if (code !== 0)
    throw new Trouble(`The starter library was not taken up: ${lastLine(text) || 'it broke off'}. See ${shown(log)}.`);
  return lastLine(text).replace(/^library: /, '');
}
