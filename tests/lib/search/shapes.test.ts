import { beforeAll, describe, expect, it } from 'vitest';
import type { SearchDocument } from '@/lib/search/search';
import { searchLibrary } from '@/lib/search/search-library';
import { contentIndex, type Content } from './content-library';
import { casQuestions, joinedTitles, misspelt, otherSpellings, pluralOf } from './shapes';

/** Shapes of questions made from the library's own titles. What is asked of each is the share of them that finds its entry first. */
let content: Content;
beforeAll(async () => {
  content = await contentIndex();
});

type Shape = (document: SearchDocument, place: number) => string[];

/** Share of the questions that a shape makes of all entries which find their entry first, in percent, and those that do not. */
function firstPlace(shape: Shape) {
  const missed: string[] = [];
  let asked = 0;
  content.documents.forEach((document, place) => {
    for (const q of shape(document, place)) {
      asked += 1;
      const [first] = searchLibrary(content.index, { q, limit: 1 }).hits;
      if (first?.title !== document.title) missed.push(`${q} → ${first?.slug ?? 'nothing'} (${document.slug})`);
    }
  });
  return { asked, percent: (100 * (asked - missed.length)) / asked, missed };
}

describe('questions made from the library’s own titles', () => {
  it('finds a title as written first, 99 of 100', () => {
    const { percent, missed, asked } = firstPlace(({ title }) => [title]);
    expect(asked).toBe(content.documents.length);
    expect(percent, missed.join('\n')).toBeGreaterThanOrEqual(99);
  });

  it('finds a title with one wrong letter first, 90 of 100', () => {
    const { percent, missed } = firstPlace(({ title }, place) => misspelt(title, place));
    expect(percent, missed.join('\n')).toBeGreaterThanOrEqual(90);
  });

  it('finds a title in the plural first, 99 of 100', () => {
    const { percent, missed } = firstPlace(({ title }) => pluralOf(title));
    expect(percent, missed.join('\n')).toBeGreaterThanOrEqual(99);
  });

  it('finds a title written without a space, or with hyphens, first, 99 of 100', () => {
    const { percent, missed } = firstPlace(({ title }) => joinedTitles(title));
    expect(percent, missed.join('\n')).toBeGreaterThanOrEqual(99);
  });

  it('finds a title in the other spelling first, always', () => {
    const { missed, asked } = firstPlace(({ title }) => otherSpellings(title));
    expect(asked).toBeGreaterThan(0);
    expect(missed).toEqual([]);
  });

  it('finds an entry by its CAS number first, with words around it or not, always', () => {
    const missed: string[] = [];
    for (const { id, codes, kind } of content.documents) {
      const own =
        kind === 'material' || kind === 'substance'
          ? codes.filter((code) => /^\d+-\d\d-\d$/.test(code)).slice(0, 1)
          : [];
      for (const q of own.flatMap(casQuestions)) {
        const [first] = searchLibrary(content.index, { q, limit: 1 }).hits;
        const found = content.documents.find((document) => document.id === `${first?.kind}:${first?.slug}`);
        if (found?.codes[0] !== own[0]) missed.push(`${q} → ${first?.slug ?? 'nothing'} (${id})`);
      }
    }
    expect(missed).toEqual([]);
  });

  it('finds an entry under each of its other names among the first three, 97 of 100', () => {
    const missed: string[] = [];
    let asked = 0;
    for (const document of content.documents)
      for (const q of document.names) {
        asked += 1;
        const { hits } = searchLibrary(content.index, { q, limit: 3 });
        if (!hits.some(({ kind, slug }) => `${kind}:${slug}` === document.id)) missed.push(`${q} (${document.slug})`);
      }
    expect((100 * (asked - missed.length)) / asked, missed.join('\n')).toBeGreaterThanOrEqual(97);
  });
});
