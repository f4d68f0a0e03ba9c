import type { EntityManager } from '@mikro-orm/postgresql';
import { z } from 'zod';
import { Invitation, Membership } from '@/entities';
import { groupRoles } from '@/entities/membership';
import type { Actor } from '@/src/access/actor';
import { demand, ofOwnGroup } from '@/src/access/policy';
import { recordChange } from '@/src/audit/record-change';
import { notFound, Refusal } from '@/src/errors';
import { queueMail } from '@/src/mail/queue-mail';
import { lockGroup } from './lock-group';
import { newSecret, secretDigest } from './secrets';
import { email } from './sign-up';
import type { LinkMaker } from './verify-address';

export const inviteInput = z.object({ email, role: z.enum(groupRoles) });

const invitedAs = { pi: 'principal investigator', researcher: 'researcher', student: 'student' };

const validForMs = 14 * 86_400_000;

/** The secret of the link is returned here and nowhere else; an open invitation of the same address is replaced. */
export async function invite(
  em: EntityManager,
  actor: Actor,
  input: z.infer<typeof inviteInput>,
  linkTo: LinkMaker,
): Promise<{ id: string; secret: string; expiresAt: Date }> {
  demand(actor, 'group.manage');
  return em.transactional(async (tx) => {
    await lockGroup(tx, actor.groupId!);
    const member = await tx.findOne(Membership, { ...ofOwnGroup(actor), person: { email: input.email } });
    if (member) {
      const detail = 'This person belongs to the group already.';
      throw new Refusal('conflict', detail, [{ pointer: '/email', detail }]);
    }
    const open = { ...ofOwnGroup(actor), email: input.email, acceptedAt: null, revokedAt: null };
    await tx.nativeUpdate(Invitation, open, { revokedAt: new Date() });
    const secret = newSecret();
    const invitation = tx.create(Invitation, {
      group: actor.groupId!,
      email: input.email,
      role: input.role,
      secretSha256: secretDigest(secret),
      invitedBy: actor.personId,
      expiresAt: new Date(Date.now() + validForMs),
    });
    await tx.flush();
    recordChange(tx, actor, {
      action: 'group.invite',
      target: { kind: 'invitation', id: invitation.id, name: input.email },
      groupId: actor.groupId,
      after: { role: input.role },
    });
    await tx.flush();
    await sendInvitation(tx, actor, invitation, linkTo(`/invitation/${secret}`));
    return { id: invitation.id, secret, expiresAt: invitation.expiresAt };
  });
}

async function sendInvitation(
  tx: EntityManager,
  actor: Actor,
  { id, email: to, role, expiresAt }: Invitation,
  link: string,
): Promise<void> {
  const data = {
    groupName: actor.groupName ?? '',
    inviterName: actor.name,
    role: invitedAs[role],
    link,
    until: expiresAt.toISOString().slice(0, 10),
  };
  await queueMail(tx, { kind: 'invitation', to, data, dedupeKey: `invitation:${id}` });
}

export async function revokeInvitation(em: EntityManager, actor: Actor, id: string): Promise<void> {
  demand(actor, 'group.manage');
  await em.transactional(async (tx) => {
    const open = { id, ...ofOwnGroup(actor), acceptedAt: null, revokedAt: null };
    if ((await tx.nativeUpdate(Invitation, open, { revokedAt: new Date() })) === 0) throw notFound('invitation');
    recordChange(tx, actor, {
      action: 'group.revokeInvitation',
      target: { kind: 'invitation', id },
      groupId: actor.groupId,
    });
  });
}
