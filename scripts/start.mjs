import { ensureBuild } from './lib/build.mjs';
import { command } from './lib/command.mjs';
import { finishMaking } from './lib/data-folder.mjs';
import { ensureMariadb, givenDatabase, openPrivate } from './lib/database.mjs';
import { migrate, takeUpLibrary } from './lib/jobs.mjs';
import { ensurePackages } from './lib/packages.mjs';
import { sitePort } from './lib/ports.mjs';
import { checkSettings, loadSettings, prepare, requireNode } from './lib/prepare.mjs';
import { DATA, shown } from './lib/root.mjs';
import { steps } from './lib/steps.mjs';
import { Trouble } from './lib/trouble.mjs';
import { startWebsite } from './lib/website.mjs';

/** `npm start`: everything from a bare machine to a website that answers, and everything stopped again at the end. `--dev` to develop. */
const dev = process.argv.includes('--dev');

/** @typedef {import('./lib/data-folder.mjs').Place} Place */

/** @param {Place} place @param {import('./lib/steps.mjs').Steps} step */
async function ensureDatabase(place, step) {
  const given = givenDatabase();
  if (given) step.done('database', `that of DATABASE_URL, ${given.where}`);
  else await ensureMariadb(place, step);
  const database = given ?? (await openPrivate(place, 'fumelore', step));
  step.done('tables', await migrate(place, database, 'latest'));
  step.done('starter library', await takeUpLibrary(place, database));
  finishMaking(place);
  return database;
}

/** Waits for what ought not to happen. @param {Place} place @param {Record<string, import('./lib/children.mjs').Child | undefined>} parts */
async function watch(place, parts) {
  const ends = Object.entries(parts).map(async ([name, child]) => {
    await (child?.done ?? new Promise(() => undefined));
    return name;
  });
  const name = await Promise.race(ends);
  const log = place.log(name === 'database' ? 'mariadb' : 'website');
  throw new Trouble(`The ${name} stopped by itself; see ${shown(log)}. npm start begins again where it was.`);
}

await command(async () => {
  requireNode();
  loadSettings();
  const { holder, place } = await prepare(DATA, dev ? 'npm run dev' : 'npm start');
  const port = await sitePort(process.env.PORT);
  const step = steps(7 - (dev ? 1 : 0) - (process.env.DATABASE_URL ? 1 : 0));
  await ensurePackages(place.log('npm'), step);
  const settings = await checkSettings(String(port));
  const address = `http://127.0.0.1:${port}`;
  const site = { port, dev, dist: settings.NEXT_DIST_DIR, baseUrl: process.env.BASE_URL || address };
  const database = await ensureDatabase(place, step);
  holder.database = true;
  if (!dev) await ensureBuild(place, database, site, step);
  const website = await startWebsite(place, database, site);
  step.done('website', 'ready');
  holder.address = address;
  console.log('There is no sign-in in this version yet: every visitor reads, and nobody edits.');
  if (settings.FUMELORE_DEMO === 'on') console.log('This is the demo: its people and its workshop are invented.');
  console.log(`Fumelore is at ${address} (Ctrl-C stops it)`);
  await watch(place, { website, database: database.child });
});
