import { LeanIndex } from './lean-index';
import { addNames, addTitle, type NameDictionary, type TitleDictionary } from './names';
import { SEARCH_KINDS, type SearchDocument } from './search';
import { indexWordsOf } from './tokens';

/** What a hit shows of a document; its running text is not kept twice. */
export type Page = Pick<SearchDocument, 'kind' | 'slug' | 'title' | 'summary' | 'url' | 'control' | 'corrections'>;

/**
 * Everything a question is answered from; replaced whole when the library changes. Documents are known by number, in the order
 * given. `kinds` holds each one's place in SEARCH_KINDS; `claims` the terms of each wrong belief of a document.
 */
export type SearchIndex = {
  lean: LeanIndex;
  names: NameDictionary;
  titles: TitleDictionary;
  pages: Page[];
  kinds: Uint8Array;
  claims: ReadonlyMap<number, ReadonlySet<string>[]>;
};

/** Documents added between two turns of the event loop: some milliseconds of work, so requests go on being answered. */
const CHUNK = 8;

const turn = () => new Promise<void>((resolve) => setTimeout(resolve, 0));
const termsOf = (text: string): ReadonlySet<string> => new Set(indexWordsOf(text).map((word) => word.term));

/**
 * Builds an index of documents, in chunks, giving the event loop a turn after each. Later changes to the documents are not seen.
 * @throws Error when two documents have the same id
 */
export async function buildIndex(documents: readonly SearchDocument[]): Promise<SearchIndex> {
  const lean = new LeanIndex();
  const names: NameDictionary = new Map();
  const titles: TitleDictionary = new Map();
  const pages: Page[] = [];
  const claims = new Map<number, ReadonlySet<string>[]>();
  for (let from = 0; from < documents.length; from += CHUNK) {
    for (const document of documents.slice(from, from + CHUNK)) {
      const { kind, slug, title, summary, url, control, corrections } = document;
      lean.add(document);
      addNames(names, document, pages.length);
      addTitle(titles, document, pages.length);
      if (corrections.length > 0)
        claims.set(
          pages.length,
          corrections.map(({ claim }) => termsOf(claim)),
        );
      pages.push({ kind, slug, title, summary, url, control, corrections });
    }
    await turn();
  }
  return {
    lean,
    names,
    titles,
    pages,
    kinds: Uint8Array.from(pages, (page) => SEARCH_KINDS.indexOf(page.kind)),
    claims,
  };
}
