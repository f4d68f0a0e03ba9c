import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import { cookies, headers } from 'next/headers';
import { notFound as showNotFound, redirect } from 'next/navigation';
import { connection } from 'next/server';
import { cache } from 'react';
import type { Actor } from '@/src/access/actor';
import { forkEm } from '@/src/db';
import { Refusal } from '@/src/errors';
import { actorOfSession } from '@/src/people/actors';
import { sessionCookieName } from '@/src/people/sessions';

/** One entity manager per render. */
export const pageEm = cache(async (): Promise<EntityManager> => {
  await connection();
  return forkEm();
});

export async function sessionSecret(): Promise<string | undefined> {
  return (await cookies()).get(sessionCookieName)?.value;
}

export const optionalActor = cache(async (): Promise<Actor | null> => {
  const secret = await sessionSecret();
  return secret ? actorOfSession(await pageEm(), secret) : null;
});

export async function pageActor(): Promise<Actor> {
  return (await optionalActor()) ?? redirect('/sign-in');
}

/** What the person may not see looks like what does not exist. */
export async function orNotFound<T>(promise: Promise<T>): Promise<T> {
  try {
    return await promise;
  } catch (error) {
    if (error instanceof Refusal && error.kind === 'notFound') showNotFound();
    throw error;
  }
}

export async function nonce(): Promise<string | undefined> {
  return (await headers()).get('x-nonce') ?? undefined;
}
