import { shown } from './root.mjs';

/** Something a person can mend: said in one line, never with a stack. */
export class Trouble extends Error {}

/** The person asked to stop while something was under way. */
export class Stopped extends Error {}

/** @type {Record<string, string>} */
const CODES = {
  EACCES: 'may not be read or written by this user',
  EPERM: 'may not be changed by this user',
  EROFS: 'is on a disk that takes no writes',
  ENOSPC: 'does not fit: the disk is full',
  EDQUOT: 'does not fit: this user has used up the disk quota',
  ENOTDIR: 'is in the way: a folder was expected',
};

/** The one line for any fault. @param {any} error @returns {string} */
export function lineFor(error) {
  if (error instanceof Trouble) return error.message;
  const said = CODES[error?.code];
  if (said) return `${error.path ? shown(error.path) : 'A file'} ${said}.`;
  return `Unexpected: ${String(error?.message ?? error).split('\n')[0]}`;
}

/** The last thing said in a longer text, for a line that points to the log. @param {string} text */
export const lastLine = (text) => text.trimEnd().split('\n').at(-1)?.trim() ?? '';
