import type { EntityManager } from '@mikro-orm/postgresql';
import type { Actor } from '@/src/access/actor';
import { Refusal } from '@/src/errors';
import { actorOfSession, actorOfToken } from '@/src/people/actors';
import { sessionCookieName } from '@/src/people/sessions';

const signInFirst = () =>
  new Refusal('unauthenticated', 'Sign in, or send a personal token as "Authorization: Bearer ...".');

/** Cookie or bearer, never both: with a bearer token cookies are ignored. */
export async function requestActor(em: EntityManager, request: Request): Promise<Actor> {
  const authorization = request.headers.get('authorization');
  if (authorization !== null) {
    const token = /^Bearer (\S{1,200})$/i.exec(authorization)?.[1];
    const actor = token ? await actorOfToken(em, token) : null;
    if (!actor) throw new Refusal('unauthenticated', 'This token is unknown, expired or revoked.');
    return actor;
  }
  const secret = cookieValue(request.headers.get('cookie'), sessionCookieName);
  const actor = secret ? await actorOfSession(em, secret) : null;
  if (!actor) throw signInFirst();
  if (request.method !== 'GET' && request.method !== 'HEAD') refuseCrossSite(request);
  return actor;
}

export function cookieValue(header: string | null, name: string): string | undefined {
  for (const part of header?.split(';') ?? []) {
    const at = part.indexOf('=');
    if (at > 0 && part.slice(0, at).trim() === name) return decodeURIComponent(part.slice(at + 1).trim());
  }
  return undefined;
}

/** A cookie travels by itself, so a change by cookie must come from our own pages. */
export function refuseCrossSite(request: Request): void {
  const site = request.headers.get('sec-fetch-site');
  const origin = request.headers.get('origin');
  const sameOrigin =
    site === null ? origin !== null && new URL(origin).host === request.headers.get('host') : site === 'same-origin';
  if (!sameOrigin) throw new Refusal('forbidden', 'This change did not come from a page of this site.');
}
