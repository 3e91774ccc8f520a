import { MAX_QUERY_CHARACTERS, MAX_QUERY_TERMS } from './limits';
import type { LeanIndex } from './lean-index';
import { stem } from './stem';
import { wordOf, wordsOf, type Word } from './tokens';

/** A term to look up for the question's words `words` (their places), with how much it counts. */
export type Wanted = { term: string; weight: number; words: number };

/**
 * A question as understood against an index.
 * `written` are its telling words as typed, at most ten; `sequence` all words in order with misspelt and joined ones mended, each with
 * the place of the telling word it came from and whether it was mended; `wanted` the terms to look up, `words` being a bit per place.
 */
export type Reading = { written: string[]; sequence: Read[]; wanted: Wanted[] };
export type Read = Word & { place: number; mended: 'no' | 'split' | 'tolerated' };

const LAST_WORD_BEGINNING = 0.5;
const SPLIT = 0.9;

/** The first words of a question, up to the last telling one that is allowed. */
function cut(query: string): Word[] {
  const words = wordsOf(query.slice(0, MAX_QUERY_CHARACTERS));
  let told = 0;
  return words.filter((word) => word.stop || (told += 1) <= MAX_QUERY_TERMS);
}

/** The term an index knows a word by; an unusual plural (`ABSes`) by the word before its ending. */
function knownTerm(lean: LeanIndex, { term, surface }: Word): string | undefined {
  const singulars = ['es', 's'].filter((end) => surface.endsWith(end)).map((end) => surface.slice(0, -end.length));
  return [term, ...singulars.map(stem)].find((one) => lean.knows(one));
}

/** One telling word: itself when the index knows it, else the words it may stand for. */
function readWord(lean: LeanIndex, word: Word, place: number, isLast: boolean): { read: Read[]; wanted: Wanted[] } {
  const { vocabulary } = lean;
  const words = 1 << place;
  const want = (term: string, weight: number): Wanted => ({ term, weight, words });
  const term = knownTerm(lean, word);
  const known = term !== undefined;
  const beginnings = isLast || !known ? vocabulary.beginning(word.surface) : [];
  const begun = beginnings.map(({ term, near }) => want(term, near * (known ? LAST_WORD_BEGINNING : 1)));
  const plain: Read = { ...word, place, mended: 'no' };
  if (known)
    return { read: [{ ...plain, term }], wanted: [want(term, 1), ...begun.filter((one) => one.term !== term)] };
  const near = vocabulary.tolerated(word.written);
  const tolerated = near.map((candidate) => want(candidate.term, candidate.near));
  const parts = vocabulary.split(word.surface)?.map((part): Read => ({ ...wordOf(part), place, mended: 'split' }));
  if (parts) {
    const told = parts.filter((part) => !part.stop).map((part) => want(part.term, SPLIT));
    return { read: parts, wanted: [...told, ...tolerated] };
  }
  const mended = near[0] && vocabulary.isHead(near[0].surface) ? near[0] : undefined;
  const read: Read = mended ? { ...plain, surface: mended.surface, term: mended.term, mended: 'tolerated' } : plain;
  return { read: [read], wanted: [...tolerated, ...begun] };
}

/** Neighbours that the index knows as one word: `air flow` for `airflow`. */
function joinedNeighbours(lean: LeanIndex, sequence: Read[]): Wanted[] {
  return sequence.slice(1).flatMap((word, i) => {
    const before = sequence[i]!;
    const term = stem(before.surface + word.surface);
    if ((before.stop && word.stop) || term.length < 5 || !lean.knows(term)) return [];
    return [{ term, weight: 1, words: (before.stop ? 0 : 1 << before.place) | (word.stop ? 0 : 1 << word.place) }];
  });
}

/** Reads a question of any length and content against an index. Never throws. */
export function readQuestion(lean: LeanIndex, query: string): Reading {
  const words = cut(query);
  const last = words.findLastIndex((word) => !word.stop);
  const reading: Reading = { written: [], sequence: [], wanted: [] };
  words.forEach((word, i) => {
    if (word.stop) return void reading.sequence.push({ ...word, place: 0, mended: 'no' });
    const { read, wanted } = readWord(lean, word, reading.written.length, i === last);
    reading.written.push(word.written);
    reading.sequence.push(...read);
    reading.wanted.push(...wanted);
  });
  reading.wanted.push(...joinedNeighbours(lean, reading.sequence));
  return reading;
}
