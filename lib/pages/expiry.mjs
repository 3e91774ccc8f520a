import { statSync } from 'node:fs';
import { mkdir, utimes, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { folder, nameOf } from './folder.mjs';

/** The tag that Next gives every page under the root layout. */
const EVERY_PAGE = '_N_T_/layout';

/** @param {string} tag */
const pathOf = (tag) => join(folder(), 'tags', nameOf(tag));

/** When a tag last expired, in milliseconds since 1970; 0 when it never did. @param {string} tag */
export const expiredAt = (tag) => statSync(pathOf(tag), { throwIfNoEntry: false })?.mtimeMs ?? 0;

/** Expires tags for every process that shares the folder: a file a tag, and its time is when. @param {string[]} tags */
export async function expireTags(tags) {
  await mkdir(join(folder(), 'tags'), { recursive: true });
  for (const tag of tags) {
    await writeFile(pathOf(tag), '');
    await utimes(pathOf(tag), new Date(), new Date());
  }
}

/** Expires every page everywhere. A process calls it after it has taken up a new library, never before. */
export const expireAll = () => expireTags([EVERY_PAGE]);
