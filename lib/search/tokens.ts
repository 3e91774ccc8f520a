import { sameSpelling } from './spelling';
import { stem } from './stem';
import { STOP_WORDS } from './stop-words';

/** One word of a text: `written` in lower case, `surface` in one spelling, `term` as indexed, `stop` when it asks rather than names. */
export type Word = { written: string; surface: string; term: string; stop: boolean };

const ROMAN: Record<string, number> = { i: 1, ii: 2, iii: 3, iv: 4, v: 5, vi: 6, vii: 7 };

/** Metals met in several oxidation states, by name and by symbol. */
const METALS: Record<string, string> = {
  chromium: 'cr',
  chrome: 'cr',
  cr: 'cr',
  iron: 'fe',
  fe: 'fe',
  copper: 'cu',
  cu: 'cu',
  lead: 'pb',
  pb: 'pb',
  tin: 'sn',
  sn: 'sn',
  manganese: 'mn',
  mn: 'mn',
  nickel: 'ni',
  ni: 'ni',
  cobalt: 'co',
  arsenic: 'as',
};
const BRACKETED = /\b([a-z]{2,9})[\s-]?\((i{1,3}|iv|v|vi{1,2}|[1-7])\+?\)/g;
const BARE = /\b([a-z]{2,9})[\s-](ii|iii|iv|vi|vii)\b/g;
const SYMBOL = /\b(cr|fe|cu|pb|sn|mn)[\s-]?\+?([1-7])\+?(?![\w.])/g;

/** Oxidation states to one form: `Cr(VI)`, `chromium vi` and `Cr 6+` all hold the word `cr6`; a name stays beside it. */
function oxidationStates(text: string): string {
  const state = (whole: string, metal: string, count: string) => {
    const symbol = Object.hasOwn(METALS, metal) ? METALS[metal]! : undefined;
    if (!symbol) return whole;
    return `${metal === symbol ? '' : `${metal} `}${symbol}${ROMAN[count] ?? count} `;
  };
  return text.replace(BRACKETED, state).replace(BARE, state).replace(SYMBOL, state);
}

/** Compatibility forms undone (subscripts, ligatures, full width), accents off, lower case, one kind of hyphen, no apostrophes. */
const plain = (text: string): string =>
  text
    .normalize('NFKD')
    .replace(/\p{M}+/gu, '')
    .toLowerCase()
    .replace(/[\u2010-\u2015\u2212\u00ad]/g, '-')
    .replace(/['\u2019\u02bc`]/g, '');

const UNITS = 'mm|cm|m|in|inch|ft|cfm|fpm|ppm|mg|kg|g|l|ml|w|kw|v|c|f|h|s|pa|deg';
const CAS = /(?<![\w-])\d{2,7}-\d{2}-\d(?![\w-])/;
const PART = new RegExp(`${CAS.source}|\\d+(?:\\.\\d+)+|\\d+(?=(?:${UNITS})(?![\\p{L}\\p{N}]))|[\\p{L}\\p{N}]+`, 'gu');

/** True for a word shaped like a CAS number. */
export const isCasNumber = (word: string): boolean => /^\d{2,7}-\d{2}-\d$/.test(word);

/** True for a word that is compared whole: numbers, CAS numbers, formulas. It takes no part in beginnings and tolerance. */
export const hasDigit = (word: string): boolean => /\p{N}/u.test(word);

/** One word on its own; `part` is plain already. */
export function wordOf(part: string): Word {
  if (hasDigit(part)) return { written: part, surface: part, term: part, stop: false };
  const surface = sameSpelling(part);
  return { written: part, surface, term: stem(surface), stop: STOP_WORDS.has(part) };
}

const COMPOUND = /[\p{L}\p{N}]+(?:-[\p{L}\p{N}]+)+/gu;

/** Hyphenated compounds of a plain text as one word each: `make-up` gives `makeup`. */
const compoundsOf = (text: string): string[] =>
  (text.includes('-') ? (text.match(COMPOUND) ?? []) : [])
    .filter((compound) => !CAS.test(compound) && compound.length <= 40)
    .map((compound) => compound.replaceAll('-', ''));

/**
 * The words of a text in order, stop words marked and kept, so that neighbours can still be joined. Never throws.
 * A CAS number is one word; `150mm` is two; the parts of `make-up` are two.
 */
export const wordsOf = (text: string): Word[] => (oxidationStates(plain(text)).match(PART) ?? []).map(wordOf);

/**
 * The words under which a text is indexed: its words without stop words, and its hyphenated compounds joined.
 * @param known words met before, by what was written; filled and used while one index is built
 */
export function indexWordsOf(text: string, known = new Map<string, Word>()): Word[] {
  const clean = plain(text);
  const parts = [...(oxidationStates(clean).match(PART) ?? []), ...compoundsOf(clean)];
  const words: Word[] = [];
  for (const part of parts) {
    const word = known.get(part) ?? wordOf(part);
    known.set(part, word);
    if (!word.stop) words.push(word);
  }
  return words;
}

/** What a name is compared as, however it is written: all terms joined. `Laser cutting`, `laser-cut` and `lasercut` are one. */
export const joined = (words: readonly Word[]): string => words.map((word) => word.term).join('');
