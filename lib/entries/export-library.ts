import 'server-only';
import { stringify } from 'yaml';
import type { Connection } from '@/lib/database';
import type { LibraryFile } from './check-library';
import type { Source } from './schema';
import { allSources, publishedRevisions } from './store';
import { FOLDERS } from './vocabulary';

/** The order in which a source's fields are written. */
const FIELDS = ['id', 'title', 'publisher', 'year', 'type', 'locator', 'url', 'seen', 'note'] as const;

/** The list of sources as a file: the one form in which it is ever written. */
export const sourcesFile = (sources: Source[]) =>
  stringify(
    sources.map((source) =>
      Object.fromEntries(FIELDS.filter((field) => source[field] !== undefined).map((field) => [field, source[field]])),
    ),
    { lineWidth: 0 },
  );

/** The published library as files: byte for byte what was imported, paths as under content/. */
export async function exportLibrary(connection: Connection): Promise<LibraryFile[]> {
  const revisions = await publishedRevisions(connection);
  return [
    ...revisions.map(({ kind, slug, markdown }) => ({ path: `${FOLDERS[kind]}/${slug}.md`, text: markdown })),
    { path: 'sources.yaml', text: sourcesFile(await allSources(connection)) },
  ];
}
