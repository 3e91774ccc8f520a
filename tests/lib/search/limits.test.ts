import fc from 'fast-check';
import { beforeAll, describe, expect, it } from 'vitest';
import { buildIndex, type SearchIndex } from '@/lib/search/build-index';
import { MAX_HITS, MAX_QUERY_CHARACTERS, MAX_QUERY_TERMS } from '@/lib/search/limits';
import { readQuestion } from '@/lib/search/reading';
import { searchLibrary } from '@/lib/search/search-library';
import { documentFor } from './factories';
import { FIXTURE } from './fixture';

let index: SearchIndex;
beforeAll(async () => {
  index = await buildIndex(FIXTURE);
});

const wordsNamed = (count: number) => Array.from({ length: count }, (_, i) => `zz${'abcdefghijkl'[i]}`);

describe('limits of a question', () => {
  it.each([
    [MAX_QUERY_CHARACTERS - 1, 1],
    [MAX_QUERY_CHARACTERS, 1],
    [MAX_QUERY_CHARACTERS + 1, 0],
  ])('reads a word that ends at character %i: %i hit', (end, hits) => {
    const q = 'pvc'.padStart(end, ' ');
    expect(searchLibrary(index, { q }).hits).toHaveLength(hits);
  });

  it.each([MAX_QUERY_TERMS - 1, MAX_QUERY_TERMS, MAX_QUERY_TERMS + 1])(
    'reads ten of %i telling words at most',
    (count) => {
      const { written } = readQuestion(index, wordsNamed(count).join(' '));
      expect(written).toHaveLength(Math.min(count, MAX_QUERY_TERMS));
    },
  );

  it('does not count asking words among the ten', () => {
    const q = `what is the ${wordsNamed(9).join(' the ')} vinyl`;
    expect(searchLibrary(index, { q }).hits[0]?.slug).toBe('pvc');
  });

  it.each([
    ['fo', 0],
    ['for', 0],
    ['form', 1],
  ])('begins a word from three letters, asking words apart: %s', (q, atLeast) => {
    expect(searchLibrary(index, { q }).total).toBeGreaterThanOrEqual(atLeast);
    if (atLeast === 0) expect(searchLibrary(index, { q }).total).toBe(0);
  });

  it.each([
    ['rosi', 'rosin'],
    ['gear', 'gear'],
  ])('finds by the beginning %s', (q) => {
    expect(searchLibrary(index, { q }).total).toBeGreaterThan(0);
  });

  it.each([
    ['forging one letter of five', 'rosim', 'colophony'],
    ['forgiving two swapped letters', 'lasre', 'laser-cutting'],
    ['forgiving two letters of eight', 'colofony', 'colophony'],
  ])('finds %s', (_, q, slug) => {
    expect(searchLibrary(index, { q }).hits[0]?.slug).toBe(slug);
  });

  it.each([
    ['two letters of seven', 'acrolik'],
    ['three letters of nine', 'kolofonie'],
  ])('does not forgive %s', (_, q) => {
    expect(searchLibrary(index, { q }).hits).toEqual([]);
  });

  it.each([
    [0, 1],
    [1, 1],
    [2, 2],
    [-5, 1],
    [2.9, 2],
    [Number.NaN, 1],
  ])('gives hits for limit %d: %i', (limit, hits) => {
    expect(searchLibrary(index, { q: 'laser', limit }).hits).toHaveLength(hits);
  });

  it('gives a hundred hits at most', async () => {
    const many = Array.from({ length: MAX_HITS + 1 }, (_, i) => documentFor('guide', `guide-${i}`, { title: 'Guide' }));
    const answer = searchLibrary(await buildIndex(many), { q: 'guide', limit: 1_000 });
    expect(answer.hits).toHaveLength(MAX_HITS);
    expect(answer.total).toBe(MAX_HITS + 1);
  });

  it('orders equal scores as the documents stand', async () => {
    const same = ['b', 'a', 'c'].map((slug) => documentFor('guide', slug, { title: 'Filter' }));
    const { hits } = searchLibrary(await buildIndex(same), { q: 'filter' });
    expect(hits.map((hit) => hit.slug)).toEqual(['b', 'a', 'c']);
  });
});

describe('any text at all', () => {
  const text = fc.oneof(
    fc.string({ unit: 'binary', maxLength: 400 }),
    fc.string({ unit: 'grapheme', maxLength: 250 }),
    fc
      .array(
        fc.constantFrom(
          'constructor',
          '__proto__',
          'CAS',
          '50-00-0',
          'Cr(VI)',
          '(((',
          '-',
          'laser',
          'aaaaaaaaaaaaaaaa',
          '₂',
        ),
      )
      .map((parts) => parts.join(' ')),
  );

  it('is a question: it never throws, and keeps to the limits', () => {
    fc.assert(
      fc.property(text, fc.integer(), (q, limit) => {
        const answer = searchLibrary(index, { q, limit });
        expect(answer.hits.length).toBeLessThanOrEqual(Math.min(MAX_HITS, FIXTURE.length));
        expect(answer.hits.length).toBeLessThanOrEqual(answer.total);
        for (const [i, hit] of answer.hits.entries()) {
          expect(hit.score).toBeGreaterThanOrEqual(answer.hits[i + 1]?.score ?? 0);
          expect(hit.matched.length).toBeGreaterThan(0);
        }
      }),
      { numRuns: 500 },
    );
  });

  it('is a document: building an index of it never throws, and its own title finds it', async () => {
    await fc.assert(
      fc.asyncProperty(text, text, async (title, body) => {
        const odd = documentFor('guide', 'odd', { title, names: [body], everyday: [body], text: body, codes: [title] });
        const built = await buildIndex([odd, ...FIXTURE]);
        const { written } = readQuestion(built, title);
        if (written.length > 0) expect(searchLibrary(built, { q: title, limit: 100 }).total).toBeGreaterThan(0);
      }),
      { numRuns: 40 },
    );
  });
});
