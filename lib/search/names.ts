import type { SearchDocument } from './search';
import { singular } from './stem';
import { joined, wordsOf, type Word } from './tokens';

/** An entry a name stands for. `weight` is 1 for a title or an own CAS number, less for other names. */
export type Named = { document: number; weight: number };

/** Every way an entry is called, to the entries called so. Keys are joined terms, so spacing, hyphens and endings do not matter. */
export type NameDictionary = Map<string, Named[]>;

/** Titles as written, singular, without spaces, to the entries so titled: tells `spray paint` from `spray painting`. */
export type TitleDictionary = Map<string, number[]>;

/** A run of words in a question that is somebody's name: words `from` up to but without `to`. */
export type NameSpan = { from: number; to: number; named: Named[] };

/** The longest name looked for, in words. */
export const MAX_NAME_WORDS = 7;
const OTHER_NAME = 0.75;
const CODE = 0.9;

/** A name's keys: whole, and without its stop words where two telling words are left (`duct and fan`, but never `weld` for `weld-on`). */
const keysOf = (name: string): string[] => {
  const words = wordsOf(name);
  const told = words.filter((word) => !word.stop);
  const keys = told.length > 1 ? [joined(words), joined(told)] : [joined(words)];
  return [...new Set(keys)].filter((key) => key.length > 1);
};

function addName(names: NameDictionary, name: string, document: number, weight: number): void {
  for (const key of keysOf(name)) {
    const named = names.get(key) ?? [];
    if (named.length === 0) names.set(key, named);
    const known = named.find((one) => one.document === document);
    if (known) known.weight = Math.max(known.weight, weight);
    else named.push({ document, weight });
  }
}

/** What a title is compared as when it is the whole question: its words in one spelling, singular, joined. */
const compact = (words: readonly Word[]): string => words.map((word) => singular(word.surface)).join('');

/** The same of a question: its telling words only. */
export const titleKey = (words: readonly Word[]): string => compact(words.filter((word) => !word.stop));

/** Enters a document's title and slug under its number in the index, with stop words and without. */
export function addTitle(titles: TitleDictionary, { title, slug }: SearchDocument, number: number): void {
  const keys = [title, slug].map((name) => wordsOf(name)).flatMap((words) => [compact(words), titleKey(words)]);
  for (const key of new Set(keys)) titles.set(key, [...(titles.get(key) ?? []), number]);
}

/** Enters a document's title, other names and codes under its number in the index. */
export function addNames(names: NameDictionary, document: SearchDocument, number: number): void {
  addName(names, document.title, number, 1);
  addName(names, document.slug, number, 1);
  for (const name of document.names) addName(names, name, number, OTHER_NAME);
  document.codes.forEach((code, place) => addName(names, code, number, place === 0 ? 1 : CODE));
}

/**
 * Names found in a question, longest first, none overlapping another.
 * @param words the question's words in order, stop words included
 */
export function nameSpans(names: NameDictionary, words: readonly Word[]): NameSpan[] {
  const spans: NameSpan[] = [];
  const taken = new Array<boolean>(words.length).fill(false);
  for (let size = Math.min(MAX_NAME_WORDS, words.length); size > 0; size -= 1)
    for (let from = 0; from + size <= words.length; from += 1) {
      const run = words.slice(from, from + size);
      if (taken.slice(from, from + size).includes(true) || run[0]!.stop || run.at(-1)!.stop) continue;
      const named = names.get(joined(run));
      if (!named) continue;
      taken.fill(true, from, from + size);
      spans.push({ from, to: from + size, named });
    }
  return spans;
}
