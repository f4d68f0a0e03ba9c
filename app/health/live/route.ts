/** The process answers: nothing more is promised. */
export const dynamic = 'force-dynamic';

export const GET = (): Response => Response.json({ status: 'ok' }, { headers: { 'cache-control': 'no-store' } });
