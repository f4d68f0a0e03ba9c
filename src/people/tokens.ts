import type { EntityManager } from '@mikro-orm/postgresql';
import { createHash, randomBytes } from 'node:crypto';
import { PersonalToken } from '@/entities';
import type { TokenScope } from '@/entities/personal-token';
import type { Actor } from '@/src/access/actor';
import { demand } from '@/src/access/policy';
import { recordChange } from '@/src/audit/record-change';
import { notFound, Refusal } from '@/src/errors';

const prefix = 'chaff_';
const dayMs = 86_400_000;
const longestDays = 365;

export const tokenDigest = (token: string) => createHash('sha256').update(token).digest('hex');

export type TokenRequest = { name: string; scopes: TokenScope[]; expiresInDays: number };

/** The token itself is returned here and nowhere else: the table keeps its hash. */
export async function makeToken(em: EntityManager, actor: Actor, request: TokenRequest) {
  demand(actor, 'token.manage');
  const { groupId } = actor;
  if (!groupId) throw new Refusal('conflict', 'Join or choose a group first: a token works for one group.');
  if (!(request.expiresInDays >= 1 && request.expiresInDays <= longestDays)) {
    throw new Refusal('invalid', `A token lasts 1 to ${longestDays} days.`);
  }
  const token = prefix + randomBytes(32).toString('base64url');
  return em.transactional(async (tx) => {
    const row = tx.create(PersonalToken, {
      person: actor.personId,
      group: groupId,
      name: request.name,
      secretSha256: tokenDigest(token),
      lastFour: token.slice(-4),
      scopes: request.scopes,
      expiresAt: new Date(Date.now() + request.expiresInDays * dayMs),
    });
    await tx.flush();
    recordChange(tx, actor, {
      action: 'token.make',
      target: { kind: 'token', id: row.id, name: request.name },
      groupId: actor.groupId,
      after: { scopes: request.scopes, expiresAt: row.expiresAt.toISOString() },
    });
    await tx.flush();
    return { id: row.id, token, expiresAt: row.expiresAt };
  });
}

export async function listTokens(em: EntityManager, actor: Actor) {
  demand(actor, 'token.manage');
  const rows = await em.find(
    PersonalToken,
    { person: actor.personId },
    { orderBy: { createdAt: 'desc' }, populate: ['group'] },
  );
  return rows.map((row) => ({
    id: row.id,
    name: row.name,
    lastFour: row.lastFour,
    group: row.group.name,
    scopes: row.scopes,
    createdAt: row.createdAt.toISOString(),
    expiresAt: row.expiresAt.toISOString(),
    lastUsedAt: row.lastUsedAt?.toISOString() ?? null,
    revokedAt: row.revokedAt?.toISOString() ?? null,
  }));
}
export type TokenItem = Awaited<ReturnType<typeof listTokens>>[number];

export async function revokeToken(em: EntityManager, actor: Actor, id: string): Promise<void> {
  demand(actor, 'token.manage');
  await em.transactional(async (tx) => {
    const own = { id, person: actor.personId, revokedAt: null };
    if ((await tx.nativeUpdate(PersonalToken, own, { revokedAt: new Date() })) === 0) throw notFound('token');
    recordChange(tx, actor, { action: 'token.revoke', target: { kind: 'token', id }, groupId: actor.groupId });
  });
}
