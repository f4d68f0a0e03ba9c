import type { EntityManager } from '@mikro-orm/postgresql';
import { createHash, randomBytes } from 'node:crypto';
import { PersonalToken } from '@/entities';
import type { TokenScope } from '@/entities/personal-token';
import type { Actor } from '@/src/access/actor';
import { demand } from '@/src/access/policy';
import { notFound, Refusal } from '@/src/errors';

const prefix = 'chaff_';
const dayMs = 86_400_000;
const longestDays = 365;

export const tokenDigest = (token: string) => createHash('sha256').update(token).digest('hex');

export type TokenRequest = { name: string; scopes: TokenScope[]; expiresInDays: number };

/** The token itself is returned here and nowhere else: the table keeps its hash. */
export async function makeToken(em: EntityManager, actor: Actor, request: TokenRequest) {
  demand(actor, 'token.manage');
  if (!actor.groupId) throw new Refusal('conflict', 'Join or choose a group first: a token works for one group.');
  if (!(request.expiresInDays >= 1 && request.expiresInDays <= longestDays)) {
    throw new Refusal('invalid', `A token lasts 1 to ${longestDays} days.`);
  }
  const token = prefix + randomBytes(32).toString('base64url');
  const row = em.create(PersonalToken, {
    person: actor.personId,
    group: actor.groupId,
    name: request.name,
    secretSha256: tokenDigest(token),
    lastFour: token.slice(-4),
    scopes: request.scopes,
    expiresAt: new Date(Date.now() + request.expiresInDays * dayMs),
  });
  await em.flush();
  return { id: row.id, token, expiresAt: row.expiresAt };
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
  const changed = await em.nativeUpdate(
    PersonalToken,
    { id, person: actor.personId, revokedAt: null },
    { revokedAt: new Date() },
  );
  if (changed === 0) throw notFound('token');
}
