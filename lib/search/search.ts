import type { Control, ControlAnswer } from '@/lib/entries/vocabulary';

/** What can be found, in the order the facets stand. */
export const SEARCH_KINDS = ['material', 'process', 'substance', 'guide', 'worksheet', 'sheet'] as const;
export type SearchKind = (typeof SEARCH_KINDS)[number];

/** A belief that is often met and wrong, with what holds instead. */
export type SearchCorrection = { claim: string; truth: string };

/**
 * What the index knows of one page. `id` is `kind:slug`. `names` are other names as written, the best known first; `codes` are CAS
 * numbers and formulas, an entry's own CAS number first; `everyday` is what a person sees, holds, smells or suffers; `related` are
 * titles of neighbours, which count for little. `control` is the strictest control among a material's reviewed pairs.
 */
export type SearchDocument = {
  id: string;
  kind: SearchKind;
  slug: string;
  title: string;
  summary: string;
  url: string;
  names: string[];
  codes: string[];
  everyday: string[];
  corrections: SearchCorrection[];
  related: string[];
  text: string;
  control?: Control;
};

/** One hit. `score` has no unit and compares within one answer only; `matched` are the words that found it. */
export type SearchHit = {
  kind: SearchKind;
  slug: string;
  title: string;
  summary: string;
  url: string;
  score: number;
  matched: string[];
  control?: Control;
  correction?: SearchCorrection;
};

/** Materials and the process that a question names together, by slug; `title` names them as their entries do. */
export type PairNames = { materials: string[]; process: string; title: string };

/** The checked answer for such a pair, as the check gives it. */
export type PairAnswer = PairNames & {
  control: ControlAnswer;
  basis: 'reviewed' | 'inferred' | 'none';
  reason: string;
  url: string;
};

/** `total` counts matches of the kind asked for; `counts` counts matches of every kind, whatever was asked for. */
export type SearchAnswer = {
  query: string;
  total: number;
  counts: Record<SearchKind, number>;
  hits: SearchHit[];
  pairNames?: PairNames;
  pair?: PairAnswer;
};
