import { existsSync } from 'node:fs';
import { openDataFolder } from './data-folder.mjs';
import { takeFolder } from './lock.mjs';
import { trimLogs } from './logs.mjs';
import { markChildren, stopLeftovers } from './processes.mjs';
import { inRoot, ROOT } from './root.mjs';
import { Trouble } from './trouble.mjs';

/** Before anything else: the right Node, and paths as from the project's folder. */
export function requireNode() {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number);
  if (major < 20 || (major === 20 && minor < 19))
    throw new Trouble(`This is Node ${process.versions.node}: version 20.19 or a later one of 20 is needed.`);
  process.chdir(ROOT);
}

/** Settings from .env; what the environment has already stays. */
export function loadSettings() {
  if (existsSync(inRoot('.env'))) process.loadEnvFile(inRoot('.env'));
}

/**
 * Takes a data folder for this command alone, and stops what a killed run left running for it.
 * @param {string} folder @param {string} what the command, for people
 */
export async function prepare(folder, what) {
  const holder = await takeFolder(folder, what);
  const place = openDataFolder(folder);
  trimLogs(place);
  markChildren(folder);
  const left = await stopLeftovers(folder);
  if (left > 0)
    console.log(`An earlier run was cut off: ${left} of its processes were still there and have been stopped.`);
  return { holder, place };
}

/**
 * Checks every setting by the same rules as the program, a line per fault.
 * @param {string} port
 */
export async function checkSettings(port) {
  const { tsImport } = await import('tsx/esm/api');
  const { parseEnv } = await tsImport('../../lib/env.ts', import.meta.url);
  // The private database has no address yet; any that is well formed may stand for it.
  const given = { DATABASE_URL: 'mysql://private@127.0.0.1/fumelore', ...withoutEmpty(process.env), PORT: port };
  const parsed = parseEnv(given);
  if (!parsed.ok) throw new Trouble(parsed.faults.join('\n'));
  return parsed.env;
}

/** @param {NodeJS.ProcessEnv} env */
const withoutEmpty = (env) => Object.fromEntries(Object.entries(env).filter(([, value]) => value !== ''));
