import { handle, jsonWithEtag } from '@/lib/api/handle';
import { problem } from '@/lib/api/problem';
import { readQuery } from '@/lib/api/read-query';
import { answerCheck } from '@/lib/check/answer-check';
import { checkQuestion } from '@/lib/check/schema';
import { liveLibrary } from '@/lib/search/live-library';

export const dynamic = 'force-dynamic';

export const GET = handle('check', async (request) => {
  const question = readQuery(request.url, checkQuestion);
  if (!question.ok) return problem(question);
  const { material, process } = question.value;
  const { library } = await liveLibrary();
  return jsonWithEtag(request, answerCheck(library, [...new Set(material)], process[0]!));
});
