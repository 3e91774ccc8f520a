import MiniSearch from 'minisearch';
import { indexWordsOf, type Word } from './tokens';
import type { SearchDocument } from './search';
import { Vocabulary } from './vocabulary';

/** What is indexed of a document, one text a field. */
export type FieldName = 'title' | 'names' | 'codes' | 'everyday' | 'corrections' | 'summary' | 'related' | 'text';

/** How much a field weighs beside running text: names as a title, neighbours below text. */
export const FIELD_BOOSTS: Readonly<Record<FieldName, number>> = {
  title: 4,
  names: 3.5,
  codes: 4,
  everyday: 2,
  corrections: 1.5,
  summary: 1.5,
  related: 0.4,
  text: 1,
};
const FIELDS = Object.keys(FIELD_BOOSTS) as FieldName[];

/** Fields whose words name something: a misspelt or joined word is taken for one of these first. */
const HEADS: ReadonlySet<string | undefined> = new Set<FieldName>(['title', 'names', 'everyday']);

const fieldText = (document: SearchDocument, field: FieldName | 'id'): string => {
  if (field === 'corrections') return document.corrections.map(({ claim, truth }) => `${claim} ${truth}`).join('\n');
  const value = document[field];
  return Array.isArray(value) ? value.join('\n') : value;
};

/** BM25+ with MiniSearch's own constants: k saturates a repeated word, b discounts a long field, d lifts any match. */
const K = 1.2;
const B = 0.7;
const D = 0.5;

/** How often a term stands in one field, by document number. */
type Frequencies = ReadonlyMap<number, number>;

/** The documents that hold one term and what each earns by it, all fields together; the two arrays run side by side. */
export type Postings = { documents: Int32Array; scores: Float32Array };

/**
 * MiniSearch 7.2.0 with its own indexing and statistics, and a leaner way to score. `search()` builds a result object with a list
 * of terms and fields for every document that matches; at 10,000 documents that is nearly all of its time, and a page shows twenty.
 * Here a term's postings are weighed once by its BM25+ formula into two flat arrays, kept while the index lives (it is replaced
 * whole, never edited), and ranking adds numbers. One thing differs: a term is as rare as the documents that hold it in any field
 * are few (BM25F: Robertson, Zaragoza, Taylor 2004), where MiniSearch counts field by field, so that a word half the texts hold and
 * two titles, such as fume, would count as rare. Documents are numbered in the order added, from 0.
 */
export class LeanIndex extends MiniSearch<SearchDocument> {
  readonly vocabulary: Vocabulary;
  readonly #postings = new Map<string, Postings>();

  constructor() {
    const vocabulary = new Vocabulary();
    const known = new Map<string, Word>();
    super({
      fields: FIELDS,
      idField: 'id',
      extractField: (document, field) => fieldText(document, field as FieldName | 'id'),
      tokenize: (text, field) =>
        indexWordsOf(text, known).map((word) => {
          vocabulary.add(word, HEADS.has(field));
          return word.term;
        }),
      processTerm: (term) => term,
      autoVacuum: false,
    });
    this.vocabulary = vocabulary;
  }

  /** True when some document holds the term. */
  knows(term: string): boolean {
    return this._index.has(term);
  }

  /** Postings of one term, weighed; undefined when no document holds it. */
  postings(term: string): Postings | undefined {
    const kept = this.#postings.get(term);
    if (kept) return kept;
    const byField = this._index.get(term);
    if (!byField) return undefined;
    const holders = new Set(FIELDS.flatMap((field) => [...(byField.get(this._fieldIds[field]!)?.keys() ?? [])]));
    const rarity = Math.log(1 + (this._documentCount - holders.size + 0.5) / (holders.size + 0.5));
    const earned = new Map<number, number>();
    for (const field of FIELDS) this.#weigh(field, byField.get(this._fieldIds[field]!), rarity, earned);
    const made = { documents: Int32Array.from(earned.keys()), scores: Float32Array.from(earned.values()) };
    this.#postings.set(term, made);
    return made;
  }

  #weigh(field: FieldName, frequencies: Frequencies | undefined, rarity: number, earned: Map<number, number>): void {
    if (!frequencies) return;
    const id = this._fieldIds[field]!;
    const mean = this._avgFieldLength[id] || 1;
    for (const [document, frequency] of frequencies) {
      const length = this._fieldLength.get(document)?.[id] ?? mean;
      const saturated = (frequency * (K + 1)) / (frequency + K * (1 - B + (B * length) / mean));
      earned.set(document, (earned.get(document) ?? 0) + FIELD_BOOSTS[field] * rarity * (D + saturated));
    }
  }
}
