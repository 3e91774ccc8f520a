import { readFileSync } from 'node:fs';
import { buildIndex } from '@/lib/search/build-index';
import { searchLibrary } from '@/lib/search/search-library';
import { contentDocuments } from '../../tests/lib/search/content-library.ts';
import { plainMiniSearch } from './search-speed.mjs';

/** Judged questions: what each accepts, and the nearest pages while none of those exists. */
export function judgedQuestions(file) {
  const [, ...lines] = readFileSync(file, 'utf8').trim().split('\n');
  return lines.map((line) => {
    const [query, need, accepted, nearest] = line.split('\t');
    return { query, need, accepted: accepted.split(','), nearest: nearest ? nearest.split(',') : [] };
  });
}

/** The judged questions that some page can answer, each with the pages that exist. */
function answerable(questions, known) {
  const existing = (ids) => ids.filter((id) => known.has(id));
  return questions
    .map((question) => ({ ...question, whole: question.accepted.every((id) => known.has(id)) }))
    .map((question) => ({ ...question, accepted: [existing(question.accepted), existing(question.nearest)] }))
    .map((question) => ({ ...question, accepted: question.accepted.find((ids) => ids.length > 0) }))
    .filter((question) => question.accepted);
}

const share = (count, of) => Math.round((1000 * count) / of) / 10;

/** Success at 1 and 3 over judged questions on the real content: the share whose first hit, or first three, hold an accepted page. */
export async function searchSuccess(file) {
  const documents = contentDocuments();
  const index = await buildIndex(documents);
  const plain = plainMiniSearch(documents);
  const rivals = {
    ours: (q) => searchLibrary(index, { q, limit: 3 }).hits.map((hit) => `${hit.kind}:${hit.slug}`),
    'MiniSearch as it comes': (q) => plain.search(q).map((hit) => hit.id),
  };
  const questions = answerable(judgedQuestions(file), new Set(documents.map((document) => document.id)));
  const groups = {
    'all, the nearest page where one is missing': questions,
    'whose pages all exist': questions.filter(({ whole }) => whole),
  };
  return Object.entries(groups).flatMap(([group, asked]) =>
    Object.entries(rivals).map(([name, find]) => {
      const places = asked.map(({ query, accepted }) => find(query).findIndex((id) => accepted.includes(id)));
      const within = (limit) => share(places.filter((place) => place >= 0 && place < limit).length, asked.length);
      return { group, name, documents: documents.length, questions: asked.length, at1: within(1), at3: within(3) };
    }),
  );
}
