export const dynamic = 'force-dynamic';

export const GET = async () => Response.json({ status: 'live' }, { headers: { 'cache-control': 'no-store' } });
