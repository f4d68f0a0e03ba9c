import type { EntityManager } from '@mikro-orm/postgresql';
import { z } from 'zod';
import { Membership, ResearchGroup } from '@/entities';
import type { Actor } from '@/src/access/actor';
import { demand } from '@/src/access/policy';
import { recordChange } from '@/src/audit/record-change';
import { notFound } from '@/src/errors';
import { lockGroup } from './lock-group';

export const groupNameInput = z.object({ name: z.string().trim().min(1, 'is needed').max(200) });

/** A further group, of which its maker is the principal investigator. */
export async function createGroup(
  em: EntityManager,
  actor: Actor,
  { name }: z.infer<typeof groupNameInput>,
): Promise<{ groupId: string }> {
  demand(actor, 'group.create');
  return em.transactional(async (tx) => {
    const group = tx.create(ResearchGroup, { name });
    tx.create(Membership, { person: actor.personId, group, role: 'pi' });
    await tx.flush();
    recordChange(tx, actor, {
      action: 'group.create',
      target: { kind: 'group', id: group.id, name },
      groupId: group.id,
    });
    await tx.flush();
    return { groupId: group.id };
  });
}

export async function renameGroup(
  em: EntityManager,
  actor: Actor,
  { name }: z.infer<typeof groupNameInput>,
): Promise<void> {
  demand(actor, 'group.manage');
  await em.transactional(async (tx) => {
    const group = await lockGroup(tx, actor.groupId!);
    recordChange(tx, actor, {
      action: 'group.rename',
      target: { kind: 'group', id: group.id, name },
      groupId: group.id,
      before: { name: group.name },
      after: { name },
    });
    group.name = name;
  });
}

/** The group to go on in: one the person belongs to, or nothing. */
export async function groupToEnter(em: EntityManager, actor: Actor, groupId: string): Promise<{ groupId: string }> {
  const membership = await em.findOne(Membership, { person: actor.personId, group: groupId });
  if (!membership) throw notFound('group');
  return { groupId };
}
