import { command } from './lib/command.mjs';
import { finishMaking, openDataFolder, readState } from './lib/data-folder.mjs';
import { ensureMariadb, givenDatabase, openPrivate, privateDatabase } from './lib/database.mjs';
import { migrate, takeUpLibrary } from './lib/jobs.mjs';
import { holderOf } from './lib/lock.mjs';
import { ensurePackages } from './lib/packages.mjs';
import { loadSettings, prepare, requireNode } from './lib/prepare.mjs';
import { DATA } from './lib/root.mjs';
import { Trouble } from './lib/trouble.mjs';

/** One job on the database: of DATABASE_URL, of the `npm start` that runs, or else the private one, started for as long as it takes. */
const JOBS = { migrate: 'latest', rollback: 'rollback', unlock: 'unlock', seed: null };

/** Only work that takes a while is worth a line here. */
const step = {
  doing: (/** @type {string} */ name, /** @type {string} */ what) => console.log(`${name}: ${what}`),
  done: () => undefined,
};

/** @returns {Promise<{ place: import('./lib/data-folder.mjs').Place, database: import('./lib/database.mjs').Database }>} */
async function reach(what) {
  const given = givenDatabase();
  const holder = given ? null : await holderOf(DATA);
  if (given || holder) {
    if (holder && !holder.database)
      throw new Trouble(`\`${holder.what}\` is just starting: try again once it is ready.`);
    const place = openDataFolder(DATA);
    return { place, database: given ?? privateDatabase(place, 'fumelore', readState(place).port ?? 0) };
  }
  const { place } = await prepare(DATA, what);
  await ensurePackages(place.log('npm'), step);
  await ensureMariadb(place, step);
  return { place, database: await openPrivate(place, 'fumelore', step) };
}

await command(async () => {
  const name = process.argv[2] ?? '';
  if (!(name in JOBS)) throw new Trouble(`node scripts/db.mjs takes one of: ${Object.keys(JOBS).join(', ')}.`);
  requireNode();
  loadSettings();
  const { place, database } = await reach(`npm run db:${name}`);
  const job = JOBS[/** @type {keyof typeof JOBS} */ (name)];
  console.log(`${name}: ${job ? await migrate(place, database, job) : await takeUpLibrary(place, database)}`);
  finishMaking(place);
});
