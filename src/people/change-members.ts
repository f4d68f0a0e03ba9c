import type { EntityManager } from '@mikro-orm/postgresql';
import { Membership, PersonalToken } from '@/entities';
import type { GroupRole } from '@/entities/membership';
import type { Actor } from '@/src/access/actor';
import { demand } from '@/src/access/policy';
import { recordChange } from '@/src/audit/record-change';
import { notFound } from '@/src/errors';
import { demandInvestigator, lockGroup } from './lock-group';

/** A group keeps at least one principal investigator, whoever else changes it at the same time. */
export async function changeRole(em: EntityManager, actor: Actor, personId: string, role: GroupRole): Promise<void> {
  demand(actor, 'group.manage');
  await em.transactional(async (tx) => {
    const membership = await lockedMembership(tx, actor.groupId!, personId);
    const before = membership.role;
    membership.role = role;
    await tx.flush();
    await demandInvestigator(tx, actor.groupId!);
    recordChange(tx, actor, {
      action: 'group.changeRole',
      target: { kind: 'person', id: personId, name: membership.person.name },
      groupId: actor.groupId,
      before: { role: before },
      after: { role },
    });
  });
}

/** What they made stays with the group; their tokens for it stop, and their sessions lose it with the next request. */
export async function removeMember(em: EntityManager, actor: Actor, personId: string): Promise<void> {
  demand(actor, 'group.manage');
  await em.transactional((tx) => leaveWith(tx, actor, personId, 'group.remove'));
}

export async function leaveGroup(em: EntityManager, actor: Actor): Promise<void> {
  demand(actor, 'group.read');
  await em.transactional((tx) => leaveWith(tx, actor, actor.personId, 'group.leave'));
}

async function leaveWith(tx: EntityManager, actor: Actor, personId: string, action: string): Promise<void> {
  const membership = await lockedMembership(tx, actor.groupId!, personId);
  const { name } = membership.person;
  tx.remove(membership);
  await tx.flush();
  await demandInvestigator(tx, actor.groupId!);
  await tx.nativeUpdate(
    PersonalToken,
    { person: personId, group: actor.groupId!, revokedAt: null },
    { revokedAt: new Date() },
  );
  recordChange(tx, actor, {
    action,
    target: { kind: 'person', id: personId, name },
    groupId: actor.groupId,
    before: { role: membership.role },
  });
}

async function lockedMembership(tx: EntityManager, groupId: string, personId: string) {
  await lockGroup(tx, groupId);
  const membership = await tx.findOne(
    Membership,
    { group: groupId, person: personId },
    { populate: ['person'], refresh: true },
  );
  if (!membership) throw notFound('member');
  return membership;
}
