import 'server-only';
import { urlOf } from '@/lib/entries/library';
import type { Source } from '@/lib/entries/schema';
import { liveLibrary } from './live-library';

export type SourceInUse = { source: Source; entries: { title: string; url: string }[] };

/** Every source of the library by title, with the entries that cite it. */
export async function sourcesInUse(): Promise<SourceInUse[]> {
  const { library } = await liveLibrary();
  return [...library.sources.values()]
    .map((source) => ({
      source,
      entries: library.entries
        .filter(({ frontMatter }) => frontMatter.sources.includes(source.id))
        .map(({ kind, slug, title }) => ({ title, url: urlOf(kind, slug) })),
    }))
    .sort((a, b) => a.source.title.localeCompare(b.source.title, 'en-GB'));
}
