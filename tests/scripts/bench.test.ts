import { describe, expect, it } from 'vitest';
import { generatedDocuments, generatedQuestions } from '@/scripts/bench/generated.mjs';
import { serverSpeed } from '@/scripts/bench/load.mjs';
import { median, timeRivals } from '@/scripts/bench/timing.mjs';

describe('what the bench measures with', () => {
  it.each([
    [[3], 3],
    [[9, 1, 5], 5],
    [[4, 1, 3, 2], 2.5],
  ])('takes the middle of %j', (values, middle) => {
    expect(median(values)).toBe(middle);
  });

  it('asks every rival every question, one round uncounted', async () => {
    const asked: string[] = [];
    const rivals = { one: (q: string) => asked.push(`one ${q}`), two: async (q: string) => asked.push(`two ${q}`) };
    const times = await timeRivals(rivals, ['a', 'b'], 1);
    expect(asked).toEqual(['one a', 'two a', 'one b', 'two b', 'one a', 'two a', 'one b', 'two b']);
    expect(Object.keys(times)).toEqual(['one', 'two']);
  });

  it('makes the same entries and questions on every run, and marks them as generated', () => {
    const documents = generatedDocuments(40);
    expect(generatedDocuments(40)).toEqual(documents);
    expect(generatedQuestions(documents, 20)).toEqual(generatedQuestions(documents, 20));
    expect(documents.every((document) => document.title.startsWith('Generated '))).toBe(true);
  });

  it('loads no server but one on loopback', async () => {
    await expect(serverSpeed('http://example.com')).rejects.toThrow(/loopback/);
  });
});
