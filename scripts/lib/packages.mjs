import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { run } from './children.mjs';
import { ROOT, shown } from './root.mjs';
import { lastLine, Trouble } from './trouble.mjs';

/** @param {string} path */
const read = (path) => JSON.parse(readFileSync(path, 'utf8')).packages ?? {};

/**
 * Whether node_modules holds what the lock file names. Npm writes its own list there last of all, so that list also tells an
 * installation that was broken off.
 * @param {string} root
 */
export function packagesAreIn(root) {
  const listed = join(root, 'node_modules', '.package-lock.json');
  if (!existsSync(listed)) return false;
  const installed = read(listed);
  return Object.entries(read(join(root, 'package-lock.json'))).every(([path, wanted]) => {
    if (path === '') return true;
    // A package for another kind of machine is named in the lock file and never installed.
    return installed[path]
      ? installed[path].version === wanted.version
      : Boolean(wanted.optional || wanted.devOptional);
  });
}

/** @param {string} log @param {import('./steps.mjs').Steps} step */
export async function ensurePackages(log, step) {
  if (packagesAreIn(ROOT)) return step.done('packages', 'ready');
  step.doing('packages', 'installing those of the lock file, once; about a minute');
  const args = ['ci', '--include=dev', '--no-audit', '--no-fund', '--no-progress'];
  const { code, missing } = await run('npm ci', 'npm', args, { log, grace: 20 });
  if (missing) throw new Trouble('npm is missing: as root, apt-get install npm, or install Node 20 with its npm.');
  if (code !== 0) throw new Trouble(`The packages could not be installed (${npmSaid(log)}); see ${shown(log)}.`);
  step.done('packages', 'installed');
}

/** @param {string} log */
function npmSaid(log) {
  const lines = readFileSync(log, 'utf8').split('\n');
  const said = lines.filter((line) => /^npm (error|ERR!) /.test(line) && !/complete log|debug-0/.test(line));
  return (said.at(1) ?? said.at(0) ?? lastLine(lines.join('\n'))).replace(/^npm (error|ERR!) /, '');
}
