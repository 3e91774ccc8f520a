import type { SearchIndex } from './build-index';
import { DEFAULT_HITS, MAX_HITS, MAX_QUERY_CHARACTERS } from './limits';
import { namesOfPair, pairAmong } from './pair-in';
import { best, favourPair, rank, type Ranking } from './ranking';
import { readQuestion, type Reading } from './reading';
import { SEARCH_KINDS, type SearchAnswer, type SearchCorrection, type SearchHit, type SearchKind } from './search';

export type SearchQuestion = { q: string; kind?: SearchKind; limit?: number };

/** A wrong belief the question comes close to: two of its telling words or more, and at least half of them, stand in the claim. */
function correctionFor(index: SearchIndex, reading: Reading, document: number): SearchCorrection | undefined {
  const claims = index.claims.get(document);
  if (!claims) return undefined;
  const told = reading.sequence.filter((word) => !word.stop);
  const common = claims.map(
    (claim) => new Set(told.filter((word) => claim.has(word.term)).map((word) => word.term)).size,
  );
  const most = Math.max(...common);
  if (most < 2 || most * 2 < told.length) return undefined;
  return index.pages[document]!.corrections[common.indexOf(most)];
}

function hitOf(index: SearchIndex, reading: Reading, ranking: Ranking, document: number): SearchHit {
  const { kind, slug, title, summary, url, control } = index.pages[document]!;
  const correction = correctionFor(index, reading, document);
  const matched = reading.written.filter((_, place) => ranking.words[document]! & (1 << place));
  const score = Math.round(ranking.scores[document]! * 100) / 100;
  return {
    ...{ kind, slug, title, summary, url, score, matched },
    ...(control ? { control } : {}),
    ...(correction ? { correction } : {}),
  };
}

function countKinds(index: SearchIndex, scores: Float64Array): Record<SearchKind, number> {
  const counts = new Array<number>(SEARCH_KINDS.length).fill(0);
  for (let document = 0; document < scores.length; document += 1)
    if (scores[document]! > 0) counts[index.kinds[document]!]! += 1;
  return Object.fromEntries(SEARCH_KINDS.map((kind, i) => [kind, counts[i]])) as Record<SearchKind, number>;
}

/**
 * Answers a question from an index. Any text is a question: a long one is cut (200 characters, 10 telling words), one without a
 * telling word finds nothing. Never throws.
 * @param limit hits wanted, 1 to 100, 20 unless told
 */
export function searchLibrary(index: SearchIndex, { q, kind, limit = DEFAULT_HITS }: SearchQuestion): SearchAnswer {
  const reading = readQuestion(index, q);
  const ranking = rank(index, reading);
  const pair = pairAmong(index, reading, ranking.spans);
  if (pair) favourPair(ranking, pair);
  const counts = countKinds(index, ranking.scores);
  const place = kind ? SEARCH_KINDS.indexOf(kind) : -1;
  const wanted = Math.min(MAX_HITS, Math.max(1, Math.trunc(limit) || 1));
  const found = best(ranking.scores, wanted, (document) => !kind || index.kinds[document] === place);
  return {
    query: q.slice(0, MAX_QUERY_CHARACTERS),
    total: kind ? counts[kind] : SEARCH_KINDS.reduce((sum, each) => sum + counts[each], 0),
    counts,
    hits: found.map((document) => hitOf(index, reading, ranking, document)),
    ...(pair ? { pairNames: namesOfPair(index, pair) } : {}),
  };
}
