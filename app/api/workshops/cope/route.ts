import { handle, readJson } from '@/lib/api/handle';
import { problem } from '@/lib/api/problem';
import { liveLibrary } from '@/lib/search/live-library';
import { answerCope } from '@/lib/workshops/answer-cope';
import { copeRequest } from '@/lib/workshops/cope-schema';
import { parseRequest } from '@/lib/worksheets/parse-request';

/** “Does mine cope?” A computation and not a write: open to anyone, keeps nothing. */
export const POST = handle('workshop cope', async (request) => {
  const body = await readJson(request);
  const question = body.ok ? parseRequest(copeRequest, body.value) : body;
  if (!question.ok) return problem(question);
  const answer = answerCope((await liveLibrary()).library, question.value);
  return answer.ok ? Response.json(answer.value, { headers: { 'cache-control': 'no-store' } }) : problem(answer);
});
