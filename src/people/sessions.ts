import type { EntityManager } from '@mikro-orm/postgresql';
import { Lucia, TimeSpan, generateIdFromEntropySize } from 'lucia';
import { createHash } from 'node:crypto';
import { Person } from '@/entities';
import { sessionAdapter, type SessionAttributes, type UserAttributes } from './session-adapter';

declare module 'lucia' {
  interface Register {
    Lucia: Lucia<SessionAttributes, UserAttributes>;
    DatabaseSessionAttributes: SessionAttributes;
    DatabaseUserAttributes: UserAttributes;
  }
}

export const sessionCookieName = '__Host-session';
export const longestSession = new TimeSpan(30, 'd');
/** Administrators sign in anew each day. */
const longestAdminSession = new TimeSpan(12, 'h');
export const idleLimit = new TimeSpan(7, 'd');

const luciaOf = (em: EntityManager) =>
  new Lucia(sessionAdapter(em), {
    sessionExpiresIn: idleLimit,
    sessionCookie: { name: sessionCookieName },
    getSessionAttributes: (attributes) => attributes,
    getUserAttributes: (attributes) => attributes,
  });

export const sessionIdOf = (secret: string) => createHash('sha256').update(secret).digest('hex');

/** Makes a session and returns the secret for the cookie; the table keeps its hash alone. */
export async function startSession(
  em: EntityManager,
  personId: string,
  groupId: string | null,
  userAgent: string,
): Promise<string> {
  const secret = generateIdFromEntropySize(25);
  const { platformRole } = await em.findOneOrFail(Person, { id: personId });
  const longest = platformRole === 'admin' ? longestAdminSession : longestSession;
  const endsAt = new Date(Date.now() + longest.milliseconds());
  await luciaOf(em).createSession(personId, { groupId, userAgent, endsAt }, { sessionId: sessionIdOf(secret) });
  return secret;
}

export async function readSession(em: EntityManager, secret: string) {
  const lucia = luciaOf(em);
  const found = await lucia.validateSession(sessionIdOf(secret));
  if (!found.session) return null;
  if (found.session.endsAt <= new Date()) {
    await lucia.invalidateSession(found.session.id);
    return null;
  }
  return found;
}

export async function endSession(em: EntityManager, secret: string): Promise<void> {
  await luciaOf(em).invalidateSession(sessionIdOf(secret));
}

export async function endAllSessions(em: EntityManager, personId: string): Promise<void> {
  await luciaOf(em).invalidateUserSessions(personId);
}
