import 'server-only';
import { cookies, headers } from 'next/headers';
import { forkEm } from '@/src/db';
import { Refusal } from '@/src/errors';
import { longestSession, sessionCookieName, startSession, endSession } from '@/src/people/sessions';
import type { FormState } from './form-state';

/** Runs an action's work and turns a refusal into what the form shows; surprises go on to the error page. */
export async function formAction<S extends FormState>(form: FormData, work: () => Promise<S>): Promise<S | FormState> {
  try {
    return await work();
  } catch (error) {
    if (!(error instanceof Refusal)) throw error;
    return refused(error, form);
  }
}

function refused(refusal: Refusal, form: FormData): FormState {
  const problems: Record<string, string> = {};
  for (const { pointer, detail } of refusal.problems) {
    const field = pointer?.replace(/^\//, '').replaceAll('/', '.');
    if (field) problems[field] ??= detail;
  }
  return { message: refusal.message, problems, values: typed(form) };
}

function typed(form: FormData): Record<string, string> {
  const kept = [...form.entries()].filter(([key, value]) => typeof value === 'string' && !/password|^\$/i.test(key));
  return Object.fromEntries(kept) as Record<string, string>;
}

/** A new secret at every sign-in; the one before it is ended, so that a fixed session is worth nothing. */
export async function openSession(personId: string, groupId: string | null): Promise<void> {
  const em = await forkEm();
  const jar = await cookies();
  const before = jar.get(sessionCookieName)?.value;
  if (before) await endSession(em, before);
  const secret = await startSession(em, personId, groupId, (await headers()).get('user-agent') ?? '');
  jar.set(sessionCookieName, secret, {
    httpOnly: true,
    secure: true,
    sameSite: 'lax',
    path: '/',
    maxAge: longestSession.seconds(),
  });
}

export async function closeSession(): Promise<void> {
  const jar = await cookies();
  const secret = jar.get(sessionCookieName)?.value;
  if (secret) await endSession(await forkEm(), secret);
  jar.delete({ name: sessionCookieName, path: '/', secure: true });
}
