import { handle } from '@/lib/api/handle';
import { problem } from '@/lib/api/problem';
import { readiness } from '@/lib/search/readiness';

export const dynamic = 'force-dynamic';

export const GET = handle('ready', async () => {
  const ready = await readiness();
  if (!ready.ok) return problem(ready, { 'retry-after': '5' });
  return Response.json({ status: 'ready', ...ready.value }, { headers: { 'cache-control': 'no-store' } });
});
