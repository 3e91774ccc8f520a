import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { checkLibrary } from '@/lib/entries/check-library';
import type { Library, PublishedEntry } from '@/lib/entries/library';
import { FOLDERS } from '@/lib/entries/vocabulary';
import { buildIndex, type SearchIndex } from '@/lib/search/build-index';
import { documentsOf } from '@/lib/search/documents';
import type { SearchDocument } from '@/lib/search/search';
import { WORKSHEETS } from '@/lib/worksheets/list';

const read = (folder: string) =>
  readdirSync(folder)
    .filter((name) => name.endsWith('.md'))
    .map((name) => ({ path: join(folder, name), text: readFileSync(join(folder, name), 'utf8') }));

/** The files under content/ as a published library, without a database. */
export function contentLibrary(): Library {
  const { entries } = checkLibrary(
    Object.values(FOLDERS).flatMap((folder) => read(join('content', folder))),
    [],
  );
  const published = entries.map(({ kind, slug, text, frontMatter, body }): PublishedEntry => ({
    ...{ kind, slug, title: frontMatter.title, revision: 1, text, frontMatter, body, hash: '' },
    ...{ publishedAt: '2026-12-01T00:00:00Z', reviewedBy: 'A reviewer', reviewDue: '2027-12-01' },
  }));
  const byKey = new Map(published.map((entry) => [`${entry.kind}:${entry.slug}`, entry]));
  return { version: 1, entries: published, byKey, sources: new Map() };
}

export type Content = { documents: SearchDocument[]; index: SearchIndex };

/** What the search knows of the real content and the worksheets. */
export const contentDocuments = (): SearchDocument[] => documentsOf(contentLibrary(), WORKSHEETS);

/** The index over the same. */
export async function contentIndex(): Promise<Content> {
  const documents = contentDocuments();
  return { documents, index: await buildIndex(documents) };
}
