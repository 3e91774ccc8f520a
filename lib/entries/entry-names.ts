import type { Library } from './library';

/** Titles of entries by `kind:slug`, as far as a page links to them. */
export type EntryNames = Record<string, string>;

/** The titles of all published entries. */
export const entryNames = (library: Library): EntryNames =>
  Object.fromEntries(library.entries.map((entry) => [`${entry.kind}:${entry.slug}`, entry.title]));
