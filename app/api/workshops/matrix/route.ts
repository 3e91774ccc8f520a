import { handle, readJson } from '@/lib/api/handle';
import { problem } from '@/lib/api/problem';
import { liveLibrary } from '@/lib/search/live-library';
import { answerMatrix } from '@/lib/workshops/answer-cope';
import { matrixRequest } from '@/lib/workshops/cope-schema';
import { parseRequest } from '@/lib/worksheets/parse-request';

/** A workshop’s stations against its usual materials. A computation and not a write. */
export const POST = handle('workshop matrix', async (request) => {
  const body = await readJson(request);
  const question = body.ok ? parseRequest(matrixRequest, body.value) : body;
  if (!question.ok) return problem(question);
  const answer = answerMatrix((await liveLibrary()).library, question.value.workshop);
  return Response.json(answer, { headers: { 'cache-control': 'no-store' } });
});
