import { handle, textWithEtag } from '@/lib/api/handle';
import { problem } from '@/lib/api/problem';
import { factsFor } from '@/lib/search/facts-for';
import { csvOf } from '@/lib/worksheets/csv';
import { worksheetNamed } from '@/lib/worksheets/list';

type Context = { params: Promise<{ name: string }> };

/** The table of a worksheet for the question in the address, for a spreadsheet. */
export const GET = handle<Context>('worksheet table', async (request, { params }) => {
  const worksheet = worksheetNamed((await params).name);
  if (!worksheet)
    return problem({ status: 404, title: 'No such worksheet', detail: 'GET /api/worksheets lists those there are.' });
  const table = worksheet.table(new URL(request.url).searchParams, await factsFor(worksheet));
  if (!table.ok) return problem(table);
  return textWithEtag(request, csvOf(table.value), {
    'content-type': 'text/csv; charset=utf-8',
    'content-disposition': `attachment; filename="${worksheet.name}.csv"`,
  });
});
