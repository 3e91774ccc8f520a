import { readFileSync } from 'node:fs';
import { contentDocuments } from '../../tests/lib/search/content-library.ts';
import { buildIndex } from '@/lib/search/build-index';
import { searchLibrary } from '@/lib/search/search-library';
import { plainMiniSearch } from './search-speed.mjs';

/** Judged questions: what each accepts, and the nearest page while none of those exists. */
export function judgedQuestions(file) {
  const [, ...lines] = readFileSync(file, 'utf8').trim().split('\n');
  return lines.map((line) => {
    const [query, need, accepted, nearest] = line.split('\t');
    return { query, need, accepted: accepted.split(','), nearest: nearest ? nearest.split(',') : [] };
  });
}

const share = (count, of) => Math.round((1000 * count) / of) / 10;

/** Success at 1 and 3 over judged questions on the real content: the share whose first hit, or first three, hold an accepted page. */
export async function searchSuccess(file) {
  const documents = contentDocuments();
  const known = new Set(documents.map((document) => document.id));
  const index = await buildIndex(documents);
  const plain = plainMiniSearch(documents);
  const rivals = {
    ours: (q) => searchLibrary(index, { q, limit: 3 }).hits.map((hit) => `${hit.kind}:${hit.slug}`),
    plain: (q) => plain.search(q).map((hit) => hit.id),
  };
  const questions = judgedQuestions(file)
    .map((question) => {
      const accepted = question.accepted.filter((id) => known.has(id));
      return { ...question, accepted: accepted.length > 0 ? accepted : question.nearest.filter((id) => known.has(id)) };
    })
    .filter((question) => question.accepted.length > 0);
  return Object.entries(rivals).map(([name, find]) => {
    const places = questions.map(({ query, accepted }) => find(query).findIndex((id) => accepted.includes(id)));
    const within = (limit) => share(places.filter((place) => place >= 0 && place < limit).length, questions.length);
    return { name, documents: documents.length, questions: questions.length, at1: within(1), at3: within(3) };
  });
}
