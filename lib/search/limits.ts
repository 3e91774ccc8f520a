/** Limits on what one question may cost. A longer question is cut, never refused; no option of the index comes from a client. */
export const MAX_QUERY_CHARACTERS = 200;
export const MAX_QUERY_TERMS = 10;
export const MIN_PREFIX_LETTERS = 3;
/** A longer word is looked up as it is: no beginnings, tolerance or parting. */
export const MAX_WORD_LETTERS = 60;
export const MAX_HITS = 100;
export const DEFAULT_HITS = 20;

/** How many words of the index one unknown word may stand for. */
export const MAX_TOLERATED = 12;
export const MAX_PREFIXED = 24;

/** Words of the index looked at before the nearest are chosen: bounds the work for a short beginning such as `con`. */
export const MAX_CANDIDATES = 400;
