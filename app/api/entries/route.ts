import { handle, jsonWithEtag } from '@/lib/api/handle';
import { problem } from '@/lib/api/problem';
import { readQuery } from '@/lib/api/read-query';
import { listEntries } from '@/lib/entries/list-entries';
import { listQuestion } from '@/lib/entries/list-schema';
import { presentLine } from '@/lib/entries/present';
import { liveLibrary } from '@/lib/search/live-library';

export const dynamic = 'force-dynamic';

export const GET = handle('entries', async (request) => {
  const question = readQuery(request.url, listQuestion);
  if (!question.ok) return problem(question);
  const { library } = await liveLibrary();
  const { items, next } = listEntries(library, question.value);
  return jsonWithEtag(request, { items: items.map(presentLine), next });
});
