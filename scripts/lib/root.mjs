import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The project's folder, from wherever the command was typed. */
export const ROOT = fileURLToPath(new URL('../../', import.meta.url)).replace(/\/$/, '');

/** Where `npm start` keeps its data, and where `npm test` does: they may run side by side. */
export const DATA = join(ROOT, '.data');
export const TEST_DATA = join(DATA, 'test');

/** @param {string[]} parts */
export const inRoot = (...parts) => join(ROOT, ...parts);

/** A path as a person in the project's folder would type it. @param {string} path */
export const shown = (path) => (path.startsWith(`${ROOT}/`) ? path.slice(ROOT.length + 1) : path);
