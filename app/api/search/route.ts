import { handle, textWithEtag } from '@/lib/api/handle';
import { problem } from '@/lib/api/problem';
import { readQuery } from '@/lib/api/read-query';
import { AnswerCache } from '@/lib/search/answer-cache';
import { findIn } from '@/lib/search/find-in-library';
import { liveLibrary } from '@/lib/search/live-library';
import { searchQuestion } from '@/lib/search/schema';

export const dynamic = 'force-dynamic';

const answers = new AnswerCache();

export const GET = handle('search', async (request) => {
  const question = readQuery(request.url, searchQuestion);
  if (!question.ok) return problem(question);
  const live = await liveLibrary();
  const key = JSON.stringify([live.library.version, question.value]);
  const text = answers.take(key, () => {
    const begun = performance.now();
    const { pairNames: _, ...answer } = findIn(live, question.value);
    return JSON.stringify({ ...answer, tookMs: Math.round((performance.now() - begun) * 1000) / 1000 });
  });
  return textWithEtag(request, text, { 'content-type': 'application/json; charset=utf-8' });
});
