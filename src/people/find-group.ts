import type { EntityManager } from '@mikro-orm/postgresql';
import { Invitation, Membership } from '@/entities';
import type { GroupRole } from '@/entities/membership';
import type { Actor } from '@/src/access/actor';
import { demand, may, ofOwnGroup } from '@/src/access/policy';

export type MemberItem = { personId: string; name: string; email: string; role: GroupRole; since: string };
export type InvitationItem = { id: string; email: string; role: GroupRole; invitedBy: string; expiresAt: string };
export type GroupItem = { name: string; members: MemberItem[]; invitations: InvitationItem[] };

/** The people of the own group; open invitations only for those who manage it. */
export async function findGroup(em: EntityManager, actor: Actor): Promise<GroupItem> {
  demand(actor, 'group.read');
  const members = await em.find(Membership, ofOwnGroup(actor), {
    populate: ['person'],
    orderBy: { createdAt: 'asc', id: 'asc' },
  });
  const open = may(actor, 'group.manage')
    ? await em.find(
        Invitation,
        { ...ofOwnGroup(actor), acceptedAt: null, revokedAt: null, expiresAt: { $gt: new Date() } },
        { populate: ['invitedBy'], orderBy: { createdAt: 'desc' } },
      )
    : [];
  return {
    name: actor.groupName ?? '',
    members: members.map(({ person, role, createdAt }) => ({
      personId: person.id,
      name: person.name,
      email: person.email,
      role,
      since: createdAt.toISOString(),
    })),
    invitations: open.map(({ id, email, role, invitedBy, expiresAt }) => ({
      id,
      email,
      role,
      invitedBy: invitedBy.name,
      expiresAt: expiresAt.toISOString(),
    })),
  };
}

/** The groups that a person may switch between. */
export async function groupsOf(em: EntityManager, actor: Actor): Promise<{ id: string; name: string }[]> {
  const rows = await em.find(
    Membership,
    { person: actor.personId },
    { populate: ['group'], orderBy: { createdAt: 'asc', id: 'asc' } },
  );
  return rows.map(({ group }) => ({ id: group.id, name: group.name }));
}
