import type { SearchIndex } from './build-index';
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
/** A word of the question as it is taken to be meant. */
export type Read = Word & { place: number; mended: 'no' | 'split' | 'tolerated' };

type Known = Pick<SearchIndex, 'lean' | 'names'>;

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

type ReadWord = { read: Read[]; wanted: Wanted[] };

const want = (word: Read, term: string, weight: number): Wanted => ({ term, weight, words: 1 << word.place });

/** The words that a word written without spaces is made of, when it is. */
const partsOf = ({ vocabulary }: LeanIndex, word: Read): Read[] =>
  (vocabulary.split(word.surface) ?? []).map((part) => ({ ...word, ...wordOf(part), mended: 'split' }));

const wantParts = (parts: Read[]): Wanted[] =>
  parts.filter((part) => !part.stop).map((part) => want(part, part.term, SPLIT));

/**
 * A word the index knows is itself; the last one may also be the beginning of a longer word. A name that some text happens to hold
 * without its space (`flame-polishing`) counts by its parts too.
 */
function readKnown({ lean, names }: Known, word: Read, isLast: boolean): ReadWord {
  const { vocabulary } = lean;
  const longer = isLast ? vocabulary.beginning(word.surface).filter(({ term }) => term !== word.term) : [];
  const begun = longer.map(({ term, near }) => want(word, term, near * LAST_WORD_BEGINNING));
  const isCompound = names.has(word.term) && !vocabulary.isHead(word.surface);
  const parts = isCompound ? wantParts(partsOf(lean, word)) : [];
  return { read: [word], wanted: [want(word, word.term, 1), ...begun, ...parts] };
}

/** A word the index does not know: a whole name written as one, the words it joins, or what it is near to or begins. */
function readUnknown({ lean, names }: Known, word: Read): ReadWord {
  const { vocabulary } = lean;
  const near = vocabulary.tolerated(word.written);
  const tolerated = near.map((candidate) => want(word, candidate.term, candidate.near));
  const isName = names.has(word.term);
  const parts = partsOf(lean, word);
  if (parts.length > 0) return { read: isName ? [word] : parts, wanted: [...wantParts(parts), ...tolerated] };
  const begun = vocabulary.beginning(word.surface).map((candidate) => want(word, candidate.term, candidate.near));
  const meant = !isName && near[0] && vocabulary.isHead(near[0].surface) ? near[0] : undefined;
  const read: Read = meant ? { ...word, surface: meant.surface, term: meant.term, mended: 'tolerated' } : word;
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
export function readQuestion(index: Known, query: string): Reading {
  const words = cut(query);
  const last = words.findLastIndex((word) => !word.stop);
  const reading: Reading = { written: [], sequence: [], wanted: [] };
  words.forEach((word, i) => {
    if (word.stop) return void reading.sequence.push({ ...word, place: 0, mended: 'no' });
    const place = reading.written.push(word.written) - 1;
    const term = knownTerm(index.lean, word);
    const plain: Read = { ...word, place, mended: 'no' };
    const { read, wanted } = term ? readKnown(index, { ...plain, term }, i === last) : readUnknown(index, plain);
    reading.sequence.push(...read);
    reading.wanted.push(...wanted);
  });
  reading.wanted.push(...joinedNeighbours(index.lean, reading.sequence));
  return reading;
}
