import { randomBytes } from 'node:crypto';
import { chmodSync, existsSync, mkdirSync, readFileSync, renameSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { shown } from './root.mjs';
import { Trouble } from './trouble.mjs';

/**
 * @typedef {object} Place  the files of one data folder
 * @property {string} folder
 * @property {string} database   the server's own files
 * @property {string} unfinished there from before the first making until its end: what lies beside it holds nobody's work
 * @property {string} state      { port }
 * @property {string} secrets
 * @property {(name: string) => string} log
 */

/** Opens, and where needed makes, a folder that only this user may look into. @param {string} folder @returns {Place} */
export function openDataFolder(folder) {
  mkdirSync(join(folder, 'logs'), { recursive: true, mode: 0o700 });
  const user = process.getuid?.();
  if (user !== undefined && statSync(folder).uid !== user)
    throw new Trouble(`${shown(folder)} belongs to another user: run this as that user, or move the folder away.`);
  chmodSync(folder, 0o700);
  const file = (/** @type {string} */ name) => join(folder, name);
  return {
    folder,
    database: file('database'),
    unfinished: file('unfinished'),
    state: file('state.json'),
    secrets: file('secrets.json'),
    log: (name) => join(folder, 'logs', `${name}.log`),
  };
}

/** Written whole or not at all. @param {string} path @param {object} value */
function writeJson(path, value) {
  writeFileSync(`${path}.new`, `${JSON.stringify(value, null, 2)}\n`, { mode: 0o600 });
  renameSync(`${path}.new`, path);
}

/** @param {string} path @returns {any} */
function readJson(path) {
  try {
    return JSON.parse(readFileSync(path, 'utf8'));
  } catch {
    return {};
  }
}

/** @param {Place} place @returns {{ port?: number }} */
export const readState = (place) => readJson(place.state);

/** @param {Place} place @param {{ port: number }} state */
export const writeState = (place, state) => writeJson(place.state, state);

/** @typedef {Record<'root' | 'app' | 'migrate' | 'test', string>} Secrets */

/** The passwords of the private database; made when missing, since every start sets them anew. @param {Place} place @returns {Secrets} */
export function secretsOf(place) {
  const make = () => randomBytes(24).toString('base64url');
  const known = readJson(place.secrets);
  const secrets = { root: make(), app: make(), migrate: make(), test: make(), ...known };
  if (Object.keys(known).length < 4) writeJson(place.secrets, secrets);
  return secrets;
}

/** Whether the server's files have to be made: there are none, or the first making never came to its end. @param {Place} place */
export const mustBeMade = (place) => !existsSync(place.database) || existsSync(place.unfinished);

/** Clears what an unfinished making left, and marks the next one as unfinished. @param {Place} place @returns {boolean} whether there was any */
export function beginMaking(place) {
  const left = existsSync(place.database);
  writeFileSync(place.unfinished, 'The first start has not come to its end: the database here is made anew.\n', {
    mode: 0o600,
  });
  rmSync(place.database, { recursive: true, force: true });
  mkdirSync(place.database, { mode: 0o700 });
  return left;
}

/** From here on the database holds people's work and is never made anew. @param {Place} place */
export const finishMaking = (place) => rmSync(place.unfinished, { force: true });

/** @param {Place} place @throws {Trouble} when the server's files are not a whole database and may hold work */
export function requireWhole(place) {
  if (existsSync(join(place.database, 'ibdata1')) && existsSync(join(place.database, 'mysql'))) return;
  const name = shown(place.database);
  throw new Trouble(
    `${name} is not a whole database: put a copy back, or move ${name} away to begin anew. Nothing was changed.`,
  );
}
