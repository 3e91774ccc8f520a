import type { SearchDocument, SearchKind } from '@/lib/search/search';

/** A document that holds only what a test is about. */
export function documentFor(kind: SearchKind, slug: string, rest: Partial<SearchDocument> = {}): SearchDocument {
  return {
    ...{ id: `${kind}:${slug}`, kind, slug, title: slug.replaceAll('-', ' '), summary: '', url: `/${kind}/${slug}` },
    ...{ names: [], codes: [], everyday: [], corrections: [], related: [], text: '' },
    ...rest,
  };
}
