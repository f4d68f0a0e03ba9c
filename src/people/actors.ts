import type { EntityManager } from '@mikro-orm/postgresql';
import { Membership, Person, PersonalToken } from '@/entities';
import { tokenScopes, type TokenScope } from '@/entities/personal-token';
import type { Actor } from '@/src/access/actor';
import { readSession } from './sessions';
import { tokenDigest } from './tokens';

/** The person behind a session cookie; membership is read afresh, so a removal counts from the next request on. */
export async function actorOfSession(em: EntityManager, secret: string): Promise<Actor | null> {
  const found = await readSession(em, secret);
  if (!found) return null;
  return actorFor(em, found.user, found.session.groupId, tokenScopes);
}

/** The person behind a personal token that is neither revoked nor expired. */
export async function actorOfToken(em: EntityManager, token: string): Promise<Actor | null> {
  const now = new Date();
  const found = await em.findOne(
    PersonalToken,
    { secretSha256: tokenDigest(token), revokedAt: null, expiresAt: { $gt: now }, person: { disabledAt: null } },
    { populate: ['person'] },
  );
  if (!found) return null;
  await em.nativeUpdate(PersonalToken, { id: found.id }, { lastUsedAt: now });
  return actorFor(em, found.person, found.group.id, found.scopes);
}

type Who = Pick<Person, 'id' | 'name' | 'email' | 'platformRole'>;

export async function actorFor(
  em: EntityManager,
  person: Who,
  groupId: string | null,
  scopes: readonly TokenScope[],
): Promise<Actor> {
  const membership = groupId
    ? await em.findOne(Membership, { person: person.id, group: groupId }, { populate: ['group'], refresh: true })
    : null;
  return {
    personId: person.id,
    name: person.name,
    email: person.email,
    groupId: membership?.group.id ?? null,
    groupName: membership?.group.name ?? null,
    role: membership?.role ?? null,
    platformRole: person.platformRole,
    scopes,
  };
}
