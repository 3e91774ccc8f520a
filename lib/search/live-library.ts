import 'server-only';
import { connection } from '@/lib/database';
import { loadLibrary } from '@/lib/entries/load-library';
import type { Library } from '@/lib/entries/library';
import { libraryVersion } from '@/lib/entries/store';
import { log } from '@/lib/log';
import { expireAll } from '@/lib/pages/expiry.mjs';
import { WORKSHEETS } from '@/lib/worksheets/list';
import { buildIndex, type SearchIndex } from './build-index';
import { documentsOf } from './documents';

/** What a process answers from: the library and the index over it, always of the same version, replaced together. */
export type Live = { library: Library; index: SearchIndex };

/** How often the version row is looked at; a publish shows everywhere within two of these and the time to load. */
export const LOOK_EVERY_MS = 700;

type Holder = typeof globalThis & { fumeloreLive?: Promise<Live>; fumeloreWatch?: NodeJS.Timeout };
const holder = globalThis as Holder;

async function load(before?: Live): Promise<Live> {
  const library = await loadLibrary(connection(), before?.library);
  return { library, index: await buildIndex(documentsOf(library, WORKSHEETS)) };
}

/** The library and index this process answers from; loaded at the first call, kept fresh by `watchLibrary`. */
export function liveLibrary(): Promise<Live> {
  holder.fumeloreLive ??= load().catch((error: unknown) => {
    holder.fumeloreLive = undefined;
    throw error;
  });
  return holder.fumeloreLive;
}

/** Looks once: when the database holds another version, loads it beside the old one, swaps, and expires stored pages. */
export async function lookOnce(): Promise<boolean> {
  const now = await liveLibrary();
  if ((await libraryVersion(connection())) === now.library.version) return false;
  const next = await load(now);
  holder.fumeloreLive = Promise.resolve(next);
  await expireAll();
  log.info({ version: next.library.version, entries: next.library.entries.length }, 'library taken up');
  return true;
}

/**
 * Begins to answer and to watch: loads the library, drops pages stored under an earlier run (the library may have changed while no
 * process ran), then looks at the version row until the process ends. A database that is away is said and tried again.
 */
export async function watchLibrary(): Promise<void> {
  if (holder.fumeloreWatch) return;
  await liveLibrary().catch((error: Error) => log.warn({ reason: error.message }, 'library could not be loaded yet'));
  await expireAll();
  const look = async () => {
    await lookOnce().catch((error: Error) => log.warn({ reason: error.message }, 'library could not be looked at'));
    holder.fumeloreWatch = setTimeout(look, LOOK_EVERY_MS).unref();
  };
  holder.fumeloreWatch = setTimeout(look, LOOK_EVERY_MS).unref();
}
