import type { EntryNames } from './entry-names';
import { entryNames } from './entry-names';
import type { Library, PublishedEntry } from './library';
import { renderBody } from './render-body';
import type { Source } from './schema';

/** All that a page needs to show an entry. */
export type EntryView = { entry: PublishedEntry; html: string; sources: Source[]; names: EntryNames };

export function entryView(library: Library, entry: PublishedEntry): EntryView {
  const { sources } = entry.frontMatter;
  return {
    entry,
    html: renderBody(entry.body, sources),
    sources: sources.flatMap((id) => library.sources.get(id) ?? []),
    names: entryNames(library),
  };
}
