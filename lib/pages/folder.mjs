import { createHash, randomBytes } from 'node:crypto';
import { existsSync, readFileSync } from 'node:fs';
import { mkdir, readdir, readFile, rename, rm, stat, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { deserialize, serialize } from 'node:v8';

/** Entries kept on disk; made-up addresses must not fill it. */
const MOST = 5000;
/** Writes of this process between two looks at how many there are. */
const BETWEEN_SWEEPS = 100;

const dist = () => join(/* turbopackIgnore: true */ process.cwd(), process.env.NEXT_DIST_DIR || '.next');

/** The folder that all processes of the site share. */
export const folder = () => process.env.PAGE_CACHE || join(dist(), 'pages');

/** @param {string} text */
export const nameOf = (text) => createHash('sha256').update(text).digest('hex');

/** @type {string | undefined} */
let build;
function buildId() {
  const file = join(dist(), 'BUILD_ID');
  return (build ??= existsSync(file) ? readFileSync(file, 'utf8') : undefined) ?? '';
}

/** @type {string | undefined} */
let lost;

/** The page for an address that leads nowhere, as the build made it; undefined where nothing was built. */
export function missingPage() {
  const file = join(dist(), 'server', 'app', '_not-found.html');
  return (lost ??= existsSync(file) ? readFileSync(file, 'utf8') : undefined);
}

// A page names the scripts of its build, so two builds that share a folder never read each other's pages.
/** @param {string} key */
const pathOf = (key) => join(folder(), 'pages', nameOf(`${buildId()} ${key}`));

/** Serialised bytes come back as plain arrays; Next wants Buffers. @param {any} value */
function withBuffers(value) {
  if (value?.rscData) value.rscData = Buffer.from(value.rscData);
  if (value?.body) value.body = Buffer.from(value.body);
  for (const [path, bytes] of value?.segmentData ?? []) value.segmentData.set(path, Buffer.from(bytes));
}

/** The stored entry, or null when there is none or it cannot be read. @param {string} key */
export async function readEntry(key) {
  try {
    const entry = deserialize(await readFile(pathOf(key)));
    withBuffers(entry.value);
    return entry;
  } catch {
    return null;
  }
}

let written = 0;

/** Stores an entry whole or not at all: written beside its place, then moved there. @param {string} key @param {any} entry */
export async function writeEntry(key, entry) {
  const path = pathOf(key);
  const draft = `${path}.${randomBytes(6).toString('hex')}`;
  await mkdir(join(folder(), 'pages'), { recursive: true });
  try {
    await writeFile(draft, serialize(entry), { flag: 'wx' });
    await rename(draft, path);
  } catch (error) {
    await rm(draft, { force: true });
    throw error;
  }
  written += 1;
  if (written % BETWEEN_SWEEPS === 0) await sweep();
}

/** Removes the oldest entries when there are more than `most`, down to nine tenths of it. */
export async function sweep(most = MOST) {
  const room = join(folder(), 'pages');
  const names = await readdir(room);
  if (names.length <= most) return;
  const dated = await Promise.all(
    names.map(async (name) => ({ name, time: (await stat(join(room, name)).catch(() => undefined))?.mtimeMs ?? 0 })),
  );
  dated.sort((a, b) => a.time - b.time);
  const surplus = dated.slice(0, names.length - Math.floor(most * 0.9));
  await Promise.all(surplus.map(({ name }) => rm(join(room, name), { force: true })));
}
