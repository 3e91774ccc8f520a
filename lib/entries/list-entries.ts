import type { Library, PublishedEntry } from './library';
import type { Kind } from './vocabulary';

export const MAX_LISTED = 100;
export const DEFAULT_LISTED = 50;

export type ListQuestion = { kind?: Kind; updatedSince?: Date; cursor?: string; limit: number };

const keyOf = ({ kind, slug }: PublishedEntry) => `${kind}:${slug}`;

/** The cursor that continues after an entry. */
export const cursorAfter = (entry: PublishedEntry) => Buffer.from(keyOf(entry)).toString('base64url');

/** The key a cursor stands for; undefined when nobody here made it. */
export function keyOfCursor(cursor: string): string | undefined {
  const key = Buffer.from(cursor, 'base64url').toString('utf8');
  return /^[a-z]+:[a-z0-9-]+$/.test(key) && Buffer.from(key).toString('base64url') === cursor ? key : undefined;
}

/** A page of published entries by kind and slug; `next` is null on the last page. */
export function listEntries(library: Library, { kind, updatedSince, cursor, limit }: ListQuestion) {
  const after = cursor ? keyOfCursor(cursor)! : '';
  const wanted = library.entries
    .filter((entry) => !kind || entry.kind === kind)
    .filter((entry) => !updatedSince || entry.publishedAt >= updatedSince.toISOString())
    .sort((a, b) => (keyOf(a) < keyOf(b) ? -1 : 1))
    .filter((entry) => keyOf(entry) > after);
  const items = wanted.slice(0, limit);
  return { items, next: wanted.length > limit ? cursorAfter(items.at(-1)!) : null };
}
