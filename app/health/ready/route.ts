import { orm } from '@/src/db';
import { log } from '@/src/log';

export const dynamic = 'force-dynamic';

/** The database answers too. */
export async function GET(): Promise<Response> {
  try {
    await (await orm()).em.getConnection().execute('select 1');
    return answer(200, 'ok');
  } catch (error) {
    log.error({ err: error }, 'not ready');
    return answer(503, 'unavailable');
  }
}

const answer = (status: number, word: string) =>
  Response.json({ status: word }, { status, headers: { 'cache-control': 'no-store' } });
