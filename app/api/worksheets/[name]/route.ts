import { handle, readJson } from '@/lib/api/handle';
import { problem } from '@/lib/api/problem';
import { factsFor } from '@/lib/search/facts-for';
import { worksheetNamed } from '@/lib/worksheets/list';

type Context = { params: Promise<{ name: string }> };

const missing = () =>
  problem({ status: 404, title: 'No such worksheet', detail: 'GET /api/worksheets lists those there are.' });

/** Answers one question. A computation and not a write: open to anyone, changes nothing. */
export const POST = handle<Context>('worksheet', async (request, { params }) => {
  const worksheet = worksheetNamed((await params).name);
  if (!worksheet) return missing();
  const body = await readJson(request);
  const answer = body.ok ? worksheet.run(body.value, await factsFor(worksheet)) : body;
  return answer.ok ? Response.json(answer.value, { headers: { 'cache-control': 'no-store' } }) : problem(answer);
});

const onlyPost = handle<Context>('worksheet', async (_, { params }) =>
  worksheetNamed((await params).name)
    ? problem(
        { status: 405, title: 'Ask with POST', detail: 'Send the question as a JSON body by POST.' },
        { allow: 'POST' },
      )
    : missing(),
);

export { onlyPost as GET, onlyPost as PUT, onlyPost as PATCH, onlyPost as DELETE };
