import 'server-only';
import { answerCheck } from '@/lib/check/answer-check';
import { checkUrl } from '@/lib/check/check';
import { type Live, liveLibrary } from './live-library';
import type { SearchAnswer } from './search';
import { searchLibrary, type SearchQuestion } from './search-library';

/** Searches one state of the library; a material and a process named together bring the checked answer of the pair. */
export function findIn({ library, index }: Live, question: SearchQuestion): SearchAnswer {
  const answer = searchLibrary(index, question);
  if (!answer.pairNames) return answer;
  const { materials, process } = answer.pairNames;
  const { control, basis, reasons } = answerCheck(library, materials, process);
  const reason = reasons[0]?.text ?? '';
  return { ...answer, pair: { ...answer.pairNames, control, basis, reason, url: checkUrl(materials, process) } };
}

/** Searches what is published now. */
export const findInLibrary = async (question: SearchQuestion): Promise<SearchAnswer> =>
  findIn(await liveLibrary(), question);
