import { createHash } from 'node:crypto';
import { lstatSync, mkdirSync, rmSync, symlinkSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Trouble } from './trouble.mjs';

/**
 * A folder with a short plain name, for this user only, outside the project: a socket's path must be under 108 bytes, and MariaDB's
 * installer does not cope with spaces. Its name follows from the data folder, so that a killed run leaves nothing that piles up.
 * @param {string} folder the data folder
 */
export function shortFolder(folder) {
  const base = /^[\w./-]{1,50}$/.test(tmpdir()) ? tmpdir() : '/tmp';
  const user = process.getuid?.() ?? 0;
  const path = join(base, `fumelore-${user}-${createHash('sha256').update(folder).digest('hex').slice(0, 10)}`);
  mkdirSync(path, { recursive: true, mode: 0o700 });
  const found = lstatSync(path);
  if (!found.isDirectory() || found.uid !== user || (found.mode & 0o077) !== 0)
    throw new Trouble(`${path} is in the way: it belongs to another user or is open to others. Remove it.`);
  return path;
}

/** Another name for the server's files, without spaces. @param {string} short @param {string} database */
export function plainName(short, database) {
  const link = join(short, 'database');
  rmSync(link, { force: true });
  symlinkSync(database, link);
  return link;
}
