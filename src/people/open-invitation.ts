import type { EntityManager } from '@mikro-orm/postgresql';
import { Invitation, Person } from '@/entities';
import { notFound } from '@/src/errors';
import { secretDigest } from './secrets';

/** What an invitation offers, for the page behind its link; one that is used, revoked, expired or unknown is nothing. */
export async function openInvitation(em: EntityManager, secret: string) {
  const invitation = await em.findOne(
    Invitation,
    { secretSha256: secretDigest(secret), acceptedAt: null, revokedAt: null, expiresAt: { $gt: new Date() } },
    { populate: ['group', 'invitedBy'] },
  );
  if (!invitation) throw notFound('invitation');
  const { id, group, email, role, invitedBy } = invitation;
  const hasAccount = (await em.count(Person, { email })) > 0;
  return { id, groupId: group.id, groupName: group.name, email, role, invitedBy: invitedBy.name, hasAccount };
}
