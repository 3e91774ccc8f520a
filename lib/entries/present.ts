import type { Library, PublishedEntry } from './library';
import { urlOf } from './library';
import { renderBody } from './render-body';

/** An entry as a line of a list. */
export const presentLine = ({ kind, slug, title, revision, publishedAt }: PublishedEntry) => ({
  ...{ kind, slug, title, revision, publishedAt },
  url: urlOf(kind, slug),
});

/** An entry whole, every outgoing field by name. `sheets` holds safety data sheets; none can hang on an entry yet. */
export function presentEntry(library: Library, entry: PublishedEntry) {
  const { kind, slug, title, revision, publishedAt, reviewedBy, reviewDue, frontMatter, body } = entry;
  return {
    ...{ kind, slug, title, revision, publishedAt, reviewedBy, reviewDue, frontMatter },
    html: renderBody(body, frontMatter.sources),
    sources: frontMatter.sources.flatMap((id) => library.sources.get(id) ?? []),
    sheets: [] as never[],
  };
}
