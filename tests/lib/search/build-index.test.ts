import { describe, expect, it } from 'vitest';
import { buildIndex } from '@/lib/search/build-index';
import { searchLibrary } from '@/lib/search/search-library';
import { documentFor } from './factories';
import { FIXTURE } from './fixture';

describe('building an index', () => {
  it('gives other work a turn between its chunks', async () => {
    const many = Array.from({ length: 400 }, (_, i) => documentFor('guide', `guide-${i}`, { text: 'air '.repeat(50) }));
    let turns = 0;
    const other = setInterval(() => (turns += 1), 0);
    await buildIndex(many);
    clearInterval(other);
    expect(turns).toBeGreaterThan(20);
  });

  it('does not see a document that changes afterwards', async () => {
    const document = documentFor('guide', 'filters', { title: 'Filters' });
    const index = await buildIndex([document]);
    document.title = 'Something else';
    expect(searchLibrary(index, { q: 'filter' }).hits[0]?.title).toBe('Filters');
  });

  it('refuses two documents with one id', async () => {
    await expect(buildIndex([FIXTURE[0]!, FIXTURE[0]!])).rejects.toThrow(/duplicate ID material:pvc/);
  });

  it('answers from an empty library', async () => {
    const answer = searchLibrary(await buildIndex([]), { q: 'pvc' });
    expect(answer).toMatchObject({ query: 'pvc', total: 0, hits: [] });
    expect(answer).not.toHaveProperty('pairNames');
  });

  it('answers alike however often it is asked', async () => {
    const index = await buildIndex(FIXTURE);
    const first = searchLibrary(index, { q: 'laser vinyl smoke' });
    for (let again = 0; again < 3; again += 1) expect(searchLibrary(index, { q: 'laser vinyl smoke' })).toEqual(first);
  });
});
