import 'server-only';
import { type EntryView, entryView } from '@/lib/entries/entry-view';
import type { Library } from '@/lib/entries/library';
import { isSlug } from '@/lib/entries/slug';
import type { Kind } from '@/lib/entries/vocabulary';
import { liveLibrary } from './live-library';

/** What a page shows of a published entry, with the library it stands in; undefined when there is none. */
export async function viewEntry(kind: Kind, slug: string): Promise<(EntryView & { library: Library }) | undefined> {
  if (!isSlug(slug)) return undefined;
  const { library } = await liveLibrary();
  const entry = library.byKey.get(`${kind}:${slug}`);
  return entry && { ...entryView(library, entry), library };
}

/** Title and description of an entry's page. */
export async function entryMetadata(kind: Kind, slug: string) {
  const view = await viewEntry(kind, slug);
  return view ? { title: view.entry.title, description: view.entry.frontMatter.summary } : {};
}
