import { beforeAll, describe, expect, it } from 'vitest';
import { buildIndex, type SearchIndex } from '@/lib/search/build-index';
import { searchLibrary } from '@/lib/search/search-library';
import { FIXTURE } from './fixture';

let index: SearchIndex;
beforeAll(async () => {
  index = await buildIndex(FIXTURE);
});

const found = (q: string) => searchLibrary(index, { q }).hits.map((hit) => hit.slug);

/** Frozen: an order that changes here is a decision, and the reason beside it must still hold. */
const ORDER: [question: string, first: string[], why: string][] = [
  ['pvc', ['pvc'], 'it is the title, and no other entry holds the word'],
  ['is vinyl ok?', ['pvc', 'acrylic'], 'an other name counts like a title; a mention in the text comes after'],
  [
    'laser',
    ['laser-cutting', 'laser-engraving', 'plywood'],
    'a whole name, then a word of a title, then of a longer name',
  ],
  ['engraving with the laser', ['laser-engraving', 'laser-cutting'], 'both words of its title, in any order'],
  ['7647-01-0', ['hydrogen-chloride'], 'a CAS number is one word and nobody else’s'],
  ['CH₂O', ['formaldehyde', 'acetal'], 'a code of its own comes before the formula of a chain in running text'],
  ['my eyes are stinging', ['formaldehyde'], 'everyday words say what a person feels'],
  ['asthma', ['colophony', 'soldering'], 'an everyday word comes before running text'],
  ['flux fumes', ['colophony', 'soldering'], 'the plural of a whole name comes before the word in a summary'],
  [
    'makeup air',
    ['make-up-air-and-flues', 'hood-airflow'],
    'however a compound is written; its second half comes after',
  ],
  ['acryllic sheet', ['acrylic'], 'one letter too many is forgiven in a word nobody has'],
  ['lasercutting plywood', ['plywood', 'laser-cutting'], 'a joined word is parted, and the two titles lead'],
  ['air flow hood', ['hood-airflow'], 'two words are joined where the title joins them'],
  [
    'carbon monoxide in the garage',
    ['carbon-monoxide', 'make-up-air-and-flues', 'plywood'],
    'title, then texts, short first',
  ],
  ['formaldehyd', ['formaldehyde'], 'a beginning is enough while typing'],
];

describe('the order of hits', () => {
  it.each(ORDER)('answers “%s” with %j first: %s', (question, first) => {
    expect(found(question).slice(0, first.length)).toEqual(first);
  });
});

describe('what a hit tells', () => {
  it('names the words of the question that found it, as typed', () => {
    const [first] = searchLibrary(index, { q: 'can I dissolve VINYL pipes' }).hits;
    expect(first).toMatchObject({ slug: 'pvc', matched: ['vinyl', 'pipes'], control: 'prohibited' });
  });

  it('shows a wrong belief when the question repeats it', () => {
    const [first] = searchLibrary(index, { q: 'does acetal give off hydrogen fluoride' }).hits;
    expect(first?.correction).toEqual({
      claim: 'Acetal gives off hydrogen fluoride when it is cut.',
      truth: 'There is no fluorine in it.',
    });
  });

  it('shows no wrong belief when only the name is asked for', () => {
    expect(searchLibrary(index, { q: 'acetal' }).hits[0]).not.toHaveProperty('correction');
  });

  it('counts matches of every kind and narrows the hits to the kind asked for', () => {
    const all = searchLibrary(index, { q: 'formaldehyde' });
    const substances = searchLibrary(index, { q: 'formaldehyde', kind: 'substance' });
    expect(all.counts).toMatchObject({ material: 2, substance: 1, guide: 0 });
    expect(all.total).toBe(3);
    expect(substances.hits.map((hit) => hit.slug)).toEqual(['formaldehyde']);
    expect(substances).toMatchObject({ total: 1, counts: all.counts });
  });

  it('finds nothing for a question without a telling word', () => {
    expect(searchLibrary(index, { q: 'what can I do with it?' })).toMatchObject({ total: 0, hits: [] });
  });
});

describe('what is not guessed', () => {
  it('never takes a number for another that is one digit off', () => {
    expect(found('7647-01-1')).toEqual([]);
  });

  it('never takes a formula for a longer one', () => {
    expect(found('CH2')).toEqual([]);
  });

  it('does not forgive a letter in a word of four', () => {
    expect(found('flix')).toEqual([]);
  });

  it('leaves a word that the index knows as it is', () => {
    expect(found('cast')).toEqual(['acrylic']);
  });
});
