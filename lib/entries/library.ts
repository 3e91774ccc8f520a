import type { FrontMatter, Source } from './schema';
import { FOLDERS, type Kind } from './vocabulary';

/** A published entry as every reader of it sees it. Times are ISO 8601 in UTC; `reviewDue` is a date. */
export type PublishedEntry = {
  kind: Kind;
  slug: string;
  title: string;
  revision: number;
  publishedAt: string;
  reviewedBy: string;
  reviewDue: string;
  hash: string;
  text: string;
  frontMatter: FrontMatter;
  body: string;
};

/** All that is published at one version; replaced whole, never edited. Keys of `byKey` are `kind:slug`. */
export type Library = {
  version: number;
  entries: PublishedEntry[];
  byKey: ReadonlyMap<string, PublishedEntry>;
  sources: ReadonlyMap<string, Source>;
};

export const urlOf = (kind: Kind, slug: string) => `/${FOLDERS[kind]}/${slug}`;
