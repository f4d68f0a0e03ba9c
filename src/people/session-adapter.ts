import type { EntityManager } from '@mikro-orm/postgresql';
import type { Adapter, DatabaseSession, DatabaseUser } from 'lucia';
import { Person, Session } from '@/entities';

export type SessionAttributes = { groupId: string | null; userAgent: string; endsAt: Date };
export type UserAttributes = { name: string; email: string; platformRole: 'member' | 'admin' };

type SessionRow = {
  id: string;
  expiresAt: Date;
  endsAt: Date;
  userAgent: string;
  person: { id: string };
  group?: { id: string } | null;
};

const toSession = (row: SessionRow): DatabaseSession => ({
  id: row.id,
  userId: row.person.id,
  expiresAt: row.expiresAt,
  attributes: { groupId: row.group?.id ?? null, userAgent: row.userAgent, endsAt: row.endsAt },
});

/** Lucia's sessions in our tables. */
export function sessionAdapter(em: EntityManager): Adapter {
  return {
    async getSessionAndUser(id): Promise<[DatabaseSession | null, DatabaseUser | null]> {
      const row = await em.findOne(
        Session,
        { id, person: { disabledAt: null } },
        { populate: ['person'], refresh: true },
      );
      if (!row) return [null, null];
      const { name, email, platformRole } = row.person;
      return [toSession(row), { id: row.person.id, attributes: { name, email, platformRole } }];
    },
    async getUserSessions(userId) {
      return (await em.find(Session, { person: userId })).map(toSession);
    },
    async setSession({ id, userId, expiresAt, attributes }) {
      await em.insert(Session, {
        id,
        person: em.getReference(Person, userId),
        group: attributes.groupId,
        userAgent: attributes.userAgent.slice(0, 300),
        createdAt: new Date(),
        expiresAt,
        endsAt: attributes.endsAt,
      });
    },
    async updateSessionExpiration(id, expiresAt) {
      await em.nativeUpdate(Session, { id }, { expiresAt });
    },
    async deleteSession(id) {
      await em.nativeDelete(Session, { id });
    },
    async deleteUserSessions(userId) {
      await em.nativeDelete(Session, { person: userId });
    },
    async deleteExpiredSessions() {
      await em.nativeDelete(Session, { expiresAt: { $lte: new Date() } });
    },
  };
}
