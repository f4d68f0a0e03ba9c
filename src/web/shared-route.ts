import type { EntityManager } from '@mikro-orm/postgresql';
import { z } from 'zod';
import { forkEm } from '@/src/db';
import { Refusal } from '@/src/errors';
import { isUnlocked, openShare, sharedRunOf } from '@/src/sharing/open-share';
import { problemResponse, refusalOfZod } from './problem';
import { cookieValue } from './request-actor';

type Context = { params: Promise<Record<string, string | string[] | undefined>> };
type Call<Query> = { em: EntityManager; run: ReturnType<typeof sharedRunOf>; query: Query };

/** The only way to the data of a shared run: the link is looked up on every request, so that revoking it works at once. */
export function sharedRoute<Query extends z.ZodObject>(
  { query: schema, isDownload = false }: { query: Query; isDownload?: boolean },
  handler: (call: Call<z.output<Query>>) => Promise<unknown>,
) {
  return async (request: Request, { params }: Context): Promise<Response> => {
    try {
      const em = await forkEm();
      const share = await openShare(em, String((await params).secret));
      const cookies = request.headers.get('cookie');
      if (!isUnlocked(share, (name) => cookieValue(cookies, name)))
        throw new Refusal('unauthenticated', 'This page asks for a passphrase first.');
      if (isDownload && !share.mayDownload) throw new Refusal('forbidden', 'This link does not allow downloads.');
      const parsed = schema.safeParse(Object.fromEntries(new URL(request.url).searchParams));
      if (!parsed.success) throw refusalOfZod(parsed.error, 'query');
      const answer = await handler({ em, run: sharedRunOf(share), query: parsed.data });
      return answer instanceof Response
        ? answer
        : Response.json(answer, { headers: { 'cache-control': 'private, no-store' } });
    } catch (error) {
      return problemResponse(error);
    }
  };
}
