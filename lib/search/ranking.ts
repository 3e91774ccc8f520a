import type { SearchIndex } from './build-index';
import { nameSpans, titleKey, type NameSpan } from './names';
import type { FoundPair } from './pair-in';
import type { Reading } from './reading';
import { isCasNumber } from './tokens';

/** What a whole name found in the question adds for each of its telling words; about what a title word earns by itself. */
const NAME_BONUS = 10;
/** A CAS number is nobody else's: it settles the question, whatever stands around it. */
const CAS_BONUS = 80;
/** A name found only after mending a misspelt word counts less. */
const MENDED = 0.6;

/** Scores of all documents for one question; `words` holds a bit for every word of the question that found the document. */
export type Ranking = { scores: Float64Array; words: Uint16Array; spans: NameSpan[] };

/**
 * Scores every document: what its terms earn (BM25+ by field, from the index), plus a bonus where the question holds a whole name
 * of it; an entry whose title is the whole question comes first. Adds numbers only; no object is built for a match.
 */
export function rank({ lean, names, titles, pages }: SearchIndex, reading: Reading): Ranking {
  const scores = new Float64Array(pages.length);
  const words = new Uint16Array(pages.length);
  for (const wanted of reading.wanted) {
    const postings = lean.postings(wanted.term);
    if (!postings) continue;
    const { documents, scores: earned } = postings;
    for (let i = 0; i < documents.length; i += 1) {
      const document = documents[i]!;
      scores[document]! += wanted.weight * earned[i]!;
      words[document]! |= wanted.words;
    }
  }
  const spans = nameSpans(names, reading.sequence);
  for (const span of spans) addBonus(reading, span, scores, words);
  const titled = titles.get(titleKey(reading.sequence)) ?? [];
  const highest = titled.length > 0 ? scores.reduce((most, score) => Math.max(most, score)) : 0;
  for (const document of titled) scores[document]! += highest;
  return { scores, words, spans };
}

function addBonus(reading: Reading, span: NameSpan, scores: Float64Array, words: Uint16Array): void {
  const told = reading.sequence.slice(span.from, span.to).filter((word) => !word.stop);
  const mended = told.some((word) => word.mended === 'tolerated');
  const places = told.reduce((bits, word) => bits | (1 << word.place), 0);
  const bonus = isCasNumber(told[0]?.term ?? '') ? CAS_BONUS : NAME_BONUS * told.length * (mended ? MENDED : 1);
  for (const { document, weight } of span.named) {
    scores[document]! += bonus * weight;
    words[document]! |= places;
  }
}

/** A question that names a pair is answered on the material's page: it earns what the process earns as well. */
export function favourPair({ scores }: Ranking, { materials, process }: FoundPair): void {
  for (const material of materials) scores[material]! += scores[process]!;
}

/**
 * The best `limit` documents among those `wanted` says yes to, best first; equal scores keep the order of the index.
 */
export function best(scores: Float64Array, limit: number, wanted: (document: number) => boolean): number[] {
  const top: number[] = [];
  for (let document = 0; document < scores.length; document += 1) {
    const score = scores[document]!;
    if (score <= 0 || (top.length === limit && score <= scores[top[limit - 1]!]!) || !wanted(document)) continue;
    let place = top.length;
    while (place > 0 && scores[top[place - 1]!]! < score) place -= 1;
    top.splice(place, 0, document);
    if (top.length > limit) top.pop();
  }
  return top;
}
