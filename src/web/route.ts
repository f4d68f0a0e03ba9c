import type { EntityManager } from '@mikro-orm/postgresql';
import { z } from 'zod';
import type { Actor } from '@/src/access/actor';
import { forkEm } from '@/src/db';
import { Refusal } from '@/src/errors';
import type { Endpoint } from './endpoint';
import { problemResponse, refusalOfZod } from './problem';
import { countAgainst } from './rate-limit';
import { requestActor } from './request-actor';

type Parsed<T extends z.ZodType | undefined> = T extends z.ZodType ? z.output<T> : undefined;

export type Call<E extends Endpoint> = {
  em: EntityManager;
  actor: Actor;
  request: Request;
  params: Parsed<E['params']>;
  query: Parsed<E['query']>;
  body: Parsed<E['body']>;
};

type Context = { params: Promise<Record<string, string | string[] | undefined>> };

const longestBody = 1024 * 1024;

/**
 * The only way into the API: actor, rate limit, parsing, errors. The endpoint's entry in the contract says what is
 * accepted; the handler calls one operation and returns what the entry promises, or a Response of its own.
 */
export function route<E extends Endpoint>(endpoint: E, handler: (call: Call<E>) => Promise<unknown>) {
  return async (request: Request, context: Context): Promise<Response> => {
    try {
      const em = await forkEm();
      const actor = await requestActor(em, request);
      if (endpoint.limit) await countAgainst(endpoint.limit, actor.personId);
      const params = parse(endpoint.params, await context.params, 'address', 'notFound');
      const query = parse(endpoint.query, queryOf(request), 'query');
      const body = endpoint.body ? parse(endpoint.body, await jsonOf(request), 'body') : undefined;
      const answer = await handler({ em, actor, request, params, query, body } as Call<E>);
      if (answer instanceof Response) return answer;
      return answer === undefined ? new Response(null, { status: 204 }) : reply(answer, endpoint.status ?? 200);
    } catch (error) {
      return problemResponse(error);
    }
  };
}

function reply(value: unknown, status: number): Response {
  return Response.json(value, { status, headers: { 'cache-control': 'private, no-store' } });
}

function parse(schema: z.ZodType | undefined, value: unknown, what: string, kind?: 'notFound'): unknown {
  if (!schema) return undefined;
  const parsed = schema.safeParse(value);
  if (parsed.success) return parsed.data;
  throw kind ? new Refusal(kind, 'There is no such thing.') : refusalOfZod(parsed.error, what);
}

function queryOf(request: Request): Record<string, string> {
  const found = new Map<string, string>();
  for (const [key, value] of new URL(request.url).searchParams) {
    if (found.has(key))
      throw new Refusal('invalid', `The query gives ${key} twice.`, [{ pointer: `/${key}`, detail: 'is given twice' }]);
    found.set(key, value);
  }
  return Object.fromEntries(found);
}

async function jsonOf(request: Request): Promise<unknown> {
  const type = request.headers.get('content-type') ?? '';
  if (!/^application\/json\b/i.test(type)) throw new Refusal('unsupported', 'Send the body as application/json.');
  const text = await limitedText(request);
  try {
    return JSON.parse(text);
  } catch {
    throw new Refusal('invalid', 'The body is not JSON.');
  }
}

async function limitedText(request: Request): Promise<string> {
  const pieces: Uint8Array[] = [];
  let size = 0;
  for await (const piece of request.body ?? []) {
    size += piece.byteLength;
    if (size > longestBody) throw new Refusal('tooLarge', 'The body may have at most 1 MiB.');
    pieces.push(piece);
  }
  return Buffer.concat(pieces).toString('utf8');
}
