import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { LibraryFile } from '@/lib/entries/check-library';
import { FOLDERS } from '@/lib/entries/vocabulary';

/** The starter library as files, paths as under content/. */
export const contentFiles = (): LibraryFile[] =>
  Object.values(FOLDERS).flatMap((folder) =>
    readdirSync(join('content', folder))
      .sort()
      .map((name) => ({ path: `${folder}/${name}`, text: readFileSync(join('content', folder, name), 'utf8') })),
  );

export const contentSources = (): LibraryFile[] => [
  { path: 'sources.yaml', text: readFileSync('content/sources.yaml', 'utf8') },
];
