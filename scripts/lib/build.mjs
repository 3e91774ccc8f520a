import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { run } from './children.mjs';
import { programEnv } from './jobs.mjs';
import { inRoot, ROOT, shown } from './root.mjs';
import { sourceHash } from './source-hash.mjs';
import { Trouble } from './trouble.mjs';

export const NEXT = inRoot('node_modules/next/dist/bin/next');

/** Next names the folder it last built into in this file, which is kept in the repository. */
const REWRITTEN = inRoot('next-env.d.ts');

/** @param {string} path */
const readOr = (path) => (existsSync(path) ? readFileSync(path, 'utf8') : '');

/**
 * Builds the website unless the build there was made from these sources.
 * @param {import('./data-folder.mjs').Place} place @param {import('./database.mjs').Database} database
 * @param {{ dist: string, baseUrl?: string }} target `dist` is the folder it is built into
 * @param {import('./steps.mjs').Steps} step
 */
export async function ensureBuild(place, database, { dist, baseUrl }, step) {
  const stamp = inRoot(dist, 'built-from');
  const hash = sourceHash(ROOT, [process.env.BASE_URL ?? '']);
  if (readOr(stamp) === hash && existsSync(inRoot(dist, 'BUILD_ID'))) return step.done('build', 'up to date');
  step.doing('build', 'building, about a minute');
  rmSync(stamp, { force: true });
  const log = place.log('build');
  const before = readOr(log).length;
  const env = { ...programEnv(database), NEXT_DIST_DIR: dist, BASE_URL: baseUrl };
  const { code } = await keeping(REWRITTEN, () => run('next build', process.execPath, [NEXT, 'build'], { log, env }));
  if (code !== 0) throw new Trouble(`The build failed (${buildSaid(readOr(log).slice(before))}); see ${shown(log)}.`);
  writeFileSync(stamp, hash);
  step.done('build', 'built');
}

/** @template T @param {string} path @param {() => Promise<T>} work @returns {Promise<T>} */
async function keeping(path, work) {
  const before = readOr(path);
  try {
    return await work();
  } finally {
    if (before && readOr(path) !== before) writeFileSync(path, before);
  }
}

/** @param {string} text */
function buildSaid(text) {
  const lines = text.split('\n').map((line) => line.trim());
  const said = lines.find((line) => /error/i.test(line) && line.length > 12) ?? lines.filter(Boolean).at(-1);
  return said ?? 'it said nothing';
}
