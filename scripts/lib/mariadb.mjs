import { existsSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { connect } from 'node:net';
import { join } from 'node:path';
import { accountsSql } from './accounts.mjs';
import { launch, run } from './children.mjs';
import { readState, secretsOf, writeState } from './data-folder.mjs';
import { findProgram } from './debian.mjs';
import { freePort } from './ports.mjs';
import { shown } from './root.mjs';
import { plainName, shortFolder } from './short-folder.mjs';
import { Trouble } from './trouble.mjs';

/** What a commit must survive, how lost updates are noticed, and one way of comparing text. */
const SETTINGS = [
  '--bind-address=127.0.0.1',
  '--skip-name-resolve',
  '--local-infile=OFF',
  '--max-allowed-packet=64M',
  '--character-set-server=utf8mb4',
  '--collation-server=utf8mb4_unicode_ci',
  '--innodb-flush-log-at-trx-commit=1',
  '--innodb-doublewrite=ON',
  '--innodb-snapshot-isolation=ON',
  '--innodb-lock-wait-timeout=5',
  '--innodb-rollback-on-timeout=ON',
  '--innodb-print-all-deadlocks=ON',
  '--server-id=1',
  '--log-bin=changes',
  '--binlog-format=ROW',
  // A trigger may be made without SUPER: rows are logged, not statements.
  '--log-bin-trust-function-creators=ON',
  '--sync-binlog=1',
  '--max-binlog-size=64M',
  '--binlog-expire-logs-seconds=259200',
];
const BOOT_SECONDS = 60;
const PORT_TRIES = 3;

/** MariaDB refuses to run as root unless told to. */
const asUser = () => (process.getuid?.() === 0 ? ['--user=root'] : []);

/** Makes the server's own files in an empty folder. @param {import('./data-folder.mjs').Place} place */
export async function makeFiles(place) {
  const log = place.log('mariadb');
  const folder = plainName(shortFolder(place.folder), place.database);
  const how = ['--auth-root-authentication-method=normal', '--skip-test-db', '--skip-log-bin'];
  const args = ['--no-defaults', ...asUser(), `--datadir=${folder}`, ...how];
  const { code } = await run('mariadb-install-db', findProgram('mariadb-install-db') ?? 'mariadb-install-db', args, {
    log,
  });
  if (code !== 0) throw new Trouble(`The database could not be made; see ${shown(log)}.`);
}

/** Whether a server greets there. @param {number} port @returns {Promise<boolean>} */
const greets = (port) =>
  new Promise((resolve) => {
    const socket = connect(port, '127.0.0.1').setTimeout(2000, () => socket.destroy());
    socket.on('error', () => undefined).on('close', () => resolve(false));
    socket.once('data', () => {
      resolve(true);
      socket.destroy();
    });
  });

/** Why the server did not come up, from what it logged since. @param {string} log @param {number} since */
function whyNot(log, since) {
  const errors =
    readFileSync(log, 'utf8')
      .slice(since)
      .match(/\[ERROR\] .*/g) ?? [];
  if (errors.some((line) => /Unable to lock|lock .*error: 11/i.test(line)))
    return 'its files are in use by another program';
  return errors.find((line) => !/Aborting/.test(line))?.replace('[ERROR] ', '') ?? 'it said nothing';
}

/**
 * @typedef {object} Server
 * @property {number} port
 * @property {import('./children.mjs').Child} child
 *
 * Starts the server on its remembered port, or on another when that is taken, and waits until it takes connections.
 * @param {import('./data-folder.mjs').Place} place @param {string} database @param {boolean} forTests @returns {Promise<Server>}
 */
export async function startMariadb(place, database, forTests) {
  const log = place.log('mariadb');
  const since = existsSync(log) ? statSync(log).size : 0;
  const accounts = join(place.folder, 'accounts.sql');
  writeFileSync(accounts, accountsSql(database, secretsOf(place), forTests), { mode: 0o600 });
  try {
    for (let attempt = 1; attempt <= PORT_TRIES; attempt += 1) {
      const port = await freePort(attempt === 1 ? readState(place).port : undefined);
      const child = serve(place, port, accounts, log);
      if (await untilUp(child, port)) {
        writeState(place, { port });
        return { port, child };
      }
      if (!/Bind on TCP\/IP port/.test(readFileSync(log, 'utf8').slice(since))) break;
    }
  } finally {
    rmSync(accounts, { force: true });
  }
  throw new Trouble(`The database does not start: ${whyNot(log, since)}. See ${shown(log)}; nothing was deleted.`);
}

/** @param {import('./data-folder.mjs').Place} place @param {number} port @param {string} accounts @param {string} log */
function serve(place, port, accounts, log) {
  const short = shortFolder(place.folder);
  const args = [
    '--no-defaults',
    ...asUser(),
    ...SETTINGS,
    `--datadir=${place.database}`,
    `--port=${port}`,
    `--socket=${join(short, 'socket')}`,
    `--pid-file=${join(place.folder, 'mariadb.pid')}`,
    `--init-file=${accounts}`,
  ];
  const child = launch('database', findProgram('mariadbd') ?? 'mariadbd', args, { log, grace: 60 });
  child.done.then(() => rmSync(short, { recursive: true, force: true }));
  return child;
}

/** @param {import('./children.mjs').Child} child @param {number} port */
async function untilUp(child, port) {
  let ended = false;
  child.done.then(() => (ended = true));
  for (const until = Date.now() + BOOT_SECONDS * 1000; Date.now() < until && !ended;) {
    if (await greets(port)) return !ended;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  return false;
}
