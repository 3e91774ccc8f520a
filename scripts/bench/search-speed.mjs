import MiniSearch from 'minisearch';
import { buildIndex } from '@/lib/search/build-index';
import { searchLibrary } from '@/lib/search/search-library';
import { generatedDocuments, generatedQuestions } from './generated.mjs';
import { timeRivals } from './timing.mjs';

const FIELDS = ['title', 'summary', 'names', 'codes', 'everyday', 'corrections', 'related', 'text'];
const flat = (value) => (Array.isArray(value) ? value.map((one) => one.claim ?? one).join('\n') : value);

/** MiniSearch as it comes: its own tokens, its own options, the same fields of the same documents. */
export function plainMiniSearch(documents) {
  const index = new MiniSearch({ fields: FIELDS, extractField: (document, field) => flat(document[field]) });
  index.addAll(documents);
  return index;
}

/** Median milliseconds a question at each size, of this search and of MiniSearch as it comes, and their ratio. */
export async function searchSpeed(sizes, rounds = 5) {
  const rows = [];
  for (const size of sizes) {
    const documents = generatedDocuments(size);
    const questions = generatedQuestions(documents, 120);
    const begun = performance.now();
    const ours = await buildIndex(documents);
    const built = performance.now() - begun;
    const plain = plainMiniSearch(documents);
    const rivals = { ours: (q) => searchLibrary(ours, { q }), plain: (q) => plain.search(q) };
    const times = await timeRivals(rivals, questions, rounds);
    rows.push({ size, built, ...times, ratio: times.ours / times.plain });
  }
  return rows;
}
