import { accessSync, constants } from 'node:fs';
import { join } from 'node:path';
import { run } from './children.mjs';
import { shown } from './root.mjs';
import { Trouble } from './trouble.mjs';

/** Debian keeps servers out of an ordinary user's path. */
const ALSO = ['/usr/local/sbin', '/usr/sbin', '/sbin', '/usr/local/bin', '/usr/bin', '/bin'];

/** @param {string} path */
function isProgram(path) {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}

/** Where a program is, or undefined. @param {string} name */
export const findProgram = (name) =>
  [...(process.env.PATH ?? '').split(':'), ...ALSO].map((folder) => join(folder || '.', name)).find(isProgram);

/**
 * Makes sure that programs are there, from Debian's packages when they are not.
 * @param {string} title for people @param {string[]} programs @param {string[]} packages @param {string} log
 * @param {(what: string) => void} doing told before work that takes a while
 * @returns {Promise<boolean>} whether anything had to be installed
 */
export async function ensurePrograms(title, programs, packages, log, doing) {
  if (programs.every(findProgram)) return false;
  const byHand = `apt-get update && apt-get install -y --no-install-recommends ${packages.join(' ')}`;
  if (process.getuid?.() !== 0) throw new Trouble(`${title} is missing: as root, ${byHand}`);
  const apt = findProgram('apt-get');
  if (!apt)
    throw new Trouble(
      `${title} is missing, and so is apt-get: install ${packages.join(' and ')} with this system's own tool.`,
    );
  doing("installing Debian's packages, once");
  const options = { log, env: { DEBIAN_FRONTEND: 'noninteractive' }, patient: true, grace: 600 };
  const wait = ['-o', 'DPkg::Lock::Timeout=120'];
  await run('apt-get update', apt, ['update', ...wait], options);
  const install = ['install', '-y', '--no-install-recommends', ...wait, ...packages];
  const { code } = await run('apt-get install', apt, install, options);
  if (code !== 0 || !programs.every(findProgram))
    throw new Trouble(`${title} could not be installed; see ${shown(log)}. By hand, as root: ${byHand}`);
  return true;
}
