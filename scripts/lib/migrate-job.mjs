import { readdirSync } from 'node:fs';
import createKnex from 'knex';
import config from '../../knexfile.ts';

/**
 * Run under tsx by jobs.mjs, with latest, rollback or unlock; its last line says what was done or why not. Signals are let pass, so that
 * a change of shape is never cut in two.
 */
for (const name of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(name, () => undefined);

const knex = createKnex(config);
const changes = (count) => `${count} ${count === 1 ? 'change' : 'changes'}`;

/** Names of changes the database holds and this version does not. */
async function unknownChanges() {
  if (!(await knex.schema.hasTable('knex_migrations'))) return [];
  const known = new Set(readdirSync(new URL('../../db/migrations/', import.meta.url)));
  return (await knex('knex_migrations').pluck('name')).filter((name) => !known.has(name));
}

async function latest() {
  const unknown = await unknownChanges();
  if (unknown.length > 0) {
    const names = unknown.slice(0, 2).join(', ');
    throw new Error(
      `The database comes from a newer version: it holds ${changes(unknown.length)} this one does not know (${names}).`,
    );
  }
  // Nobody else can be at work on the private database: a lock there was left by a killed run.
  if (process.env.FUMELORE_OURS) await knex.migrate.forceFreeMigrationsLock();
  const [, made] = await knex.migrate.latest();
  const all = await knex('knex_migrations').count({ count: '*' }).first();
  return made.length > 0 ? `${changes(made.length)} made` : `up to date, ${changes(all?.count ?? 0)}`;
}

async function rollback() {
  const [, undone] = await knex.migrate.rollback();
  return `${changes(undone.length)} undone`;
}

async function unlock() {
  await knex.migrate.forceFreeMigrationsLock();
  return 'unlocked';
}

/** One line for what Knex or the server said. */
function lineFor(error) {
  if (error.name === 'MigrationLocked' || /migration table is already locked/i.test(error.message))
    return 'Another run is changing these tables, or was cut off: when none runs, node scripts/db.mjs unlock.';
  if (['ECONNREFUSED', 'ENOTFOUND', 'ETIMEDOUT', 'EHOSTUNREACH'].includes(error.code))
    return `The database at ${config.connection.host}:${config.connection.port} does not answer (${error.code}).`;
  if (error.errno === 1045)
    return `The database turned the account ${config.connection.user} away: wrong name or password.`;
  const said = error.sqlMessage ?? error.message.split('\n')[0];
  return error.sqlMessage ? `The tables could not be changed: ${said}.` : said;
}

try {
  console.log(await { latest, rollback, unlock }[process.argv[2]]());
} catch (error) {
  console.error(error);
  console.log(lineFor(error));
  process.exitCode = 1;
}
await knex.destroy();
