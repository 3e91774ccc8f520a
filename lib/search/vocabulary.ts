import SearchableMap from 'minisearch/SearchableMap';
import { MAX_CANDIDATES, MAX_PREFIXED, MAX_TOLERATED, MAX_WORD_LETTERS, MIN_PREFIX_LETTERS } from './limits';
import { STOP_WORDS } from './stop-words';
import { hasDigit, type Word } from './tokens';

/** A word of the index that a question's word may stand for. `near` is 1 for the same word, less the further off. */
export type Candidate = { surface: string; term: string; near: number };

const MAX_PARTS = 5;

const fits = (word: string, least: number) =>
  word.length >= least && word.length <= MAX_WORD_LETTERS && !hasDigit(word);

const swapsOf = (word: string): string[] =>
  Array.from({ length: word.length - 1 }, (_, i) => word.slice(0, i) + word[i + 1] + word[i] + word.slice(i + 2));

/**
 * The words of the index before stemming, in MiniSearch's own radix tree. Stemming first would put `prinitng` four edits from
 * `print`; here it is two from `printing`. Words with digits are left out: a number one digit off is another number.
 */
export class Vocabulary {
  readonly #terms = new SearchableMap<string>();
  readonly #known = new Set<string>();
  readonly #heads = new Set<string>();

  /** Enters a word in both spellings; `head` when it stands in a title, a name or an everyday word. */
  add({ written, surface, term }: Word, head: boolean): void {
    if (head) this.#heads.add(written).add(surface);
    if (this.#known.has(written) || hasDigit(written)) return;
    this.#known.add(written);
    this.#terms.set(written, term);
    this.#terms.set(surface, term);
  }

  /** True when the word stands in a title, a name or an everyday word. */
  isHead(surface: string): boolean {
    return this.#heads.has(surface);
  }

  /**
   * Words of five letters or more within one edit, or two when the question's word has eight; the nearest only, naming words
   * before the others; two neighbours swapped count as one edit.
   */
  tolerated(surface: string): Candidate[] {
    if (!fits(surface, 4)) return [];
    const swapped = swapsOf(surface).filter((swap) => this.#heads.has(swap));
    const found = swapped.map((swap): [string, number] => [swap, 1]);
    for (const [other, [, distance]] of this.#terms.fuzzyGet(surface, surface.length < 8 ? 1 : 2))
      if (other.length > 4) found.push([other, distance]);
    const order = ([other, distance]: [string, number]) => distance + (this.#heads.has(other) ? 0 : 0.5);
    found.sort((a, b) => order(a) - order(b) || a[0].localeCompare(b[0]));
    const nearest = found[0]?.[1];
    return found
      .filter(([, distance]) => distance === nearest)
      .slice(0, MAX_TOLERATED)
      .map((one) => this.#candidate(one[0], 0.7 - 0.2 * order(one)));
  }

  /** Words that begin so, the shortest first. */
  beginning(surface: string): Candidate[] {
    if (!fits(surface, MIN_PREFIX_LETTERS)) return [];
    const found: string[] = [];
    for (const [other] of this.#terms.atPrefix(surface)) {
      if (other !== surface) found.push(other);
      if (found.length >= MAX_CANDIDATES) break;
    }
    found.sort((a, b) => a.length - b.length || (a < b ? -1 : 1));
    return found.slice(0, MAX_PREFIXED).map((other) => this.#candidate(other, (0.4 * surface.length) / other.length));
  }

  /** A word written without its spaces, as the fewest naming words that make it up; undefined when it is none. */
  split(surface: string): string[] | undefined {
    if (!fits(surface, 6)) return undefined;
    const best: (string[] | undefined)[] = [[]];
    for (let end = 2; end <= surface.length; end += 1)
      for (let start = 0; start <= end - 2; start += 1) {
        const before = best[start];
        const fewest = best[end]?.length ?? MAX_PARTS + 1;
        if (!before || before.length + 1 >= fewest) continue;
        const part = surface.slice(start, end);
        if (part.length > 2 ? this.#heads.has(part) || STOP_WORDS.has(part) : STOP_WORDS.has(part))
          best[end] = [...before, part];
      }
    return best[surface.length];
  }

  #candidate(surface: string, near: number): Candidate {
    return { surface, term: this.#terms.get(surface)!, near };
  }
}
