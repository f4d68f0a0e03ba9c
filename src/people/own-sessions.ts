import type { EntityManager } from '@mikro-orm/postgresql';
import { Session } from '@/entities';
import type { Actor } from '@/src/access/actor';
import { recordChange } from '@/src/audit/record-change';
import { notFound } from '@/src/errors';
import { idleLimit, sessionIdOf } from './sessions';

export type SessionItem = { id: string; userAgent: string; begunAt: string; seenAt: string; isThisOne: boolean };

/** The sessions of a person; the ids are hashes and open nothing. */
export async function listSessions(
  em: EntityManager,
  actor: Actor,
  ownSecret: string | undefined,
): Promise<SessionItem[]> {
  const rows = await em.find(
    Session,
    { person: actor.personId, expiresAt: { $gt: new Date() } },
    { orderBy: { createdAt: 'desc' } },
  );
  const own = ownSecret === undefined ? null : sessionIdOf(ownSecret);
  return rows.map(({ id, userAgent, createdAt, expiresAt }) => ({
    id,
    userAgent,
    begunAt: createdAt.toISOString(),
    seenAt: new Date(Math.max(createdAt.getTime(), expiresAt.getTime() - idleLimit.milliseconds())).toISOString(),
    isThisOne: id === own,
  }));
}

export async function endOwnSession(em: EntityManager, actor: Actor, id: string): Promise<void> {
  await em.transactional(async (tx) => {
    if ((await tx.nativeDelete(Session, { id, person: actor.personId })) === 0) throw notFound('session');
    recordChange(tx, actor, {
      action: 'account.endSession',
      target: { kind: 'person', id: actor.personId, name: actor.name },
      groupId: null,
    });
  });
}
