import { createHash } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

/** What a build does not read, or writes itself. Everything else counts, so that a new file is never forgotten. */
const LEFT_OUT = [
  /^(node_modules|tests|scripts|content|coverage|test-results)$/,
  /^\.(?!npmrc$)/,
  /^next-env\.d\.ts$/,
  /^(vitest|playwright|eslint)\.config\./,
  /^knexfile\.ts$/,
  /\.(md|tsbuildinfo|log)$/,
];

/** @param {string} root @param {string} folder @returns {string[]} */
function filesUnder(root, folder) {
  return readdirSync(join(root, folder), { withFileTypes: true })
    .filter((entry) => folder !== '' || !LEFT_OUT.some((pattern) => pattern.test(entry.name)))
    .sort((a, b) => (a.name < b.name ? -1 : 1))
    .flatMap((entry) => {
      const path = join(folder, entry.name);
      if (entry.isDirectory()) return filesUnder(root, path);
      return entry.isFile() ? [path] : [];
    });
}

/** One value for everything a build is made from. @param {string} root @param {string[]} [also] settings that a build takes in */
export function sourceHash(root, also = []) {
  const hash = createHash('sha256').update(JSON.stringify(also));
  for (const path of filesUnder(root, '')) hash.update(`\0${path}\0`).update(readFileSync(join(root, path)));
  return hash.digest('hex');
}
