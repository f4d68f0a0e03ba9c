import { LockMode, type EntityManager } from '@mikro-orm/postgresql';
import { Membership, ResearchGroup } from '@/entities';
import { Refusal } from '@/src/errors';

/** Changes of who belongs to a group happen one after another. */
export async function lockGroup(tx: EntityManager, groupId: string): Promise<ResearchGroup> {
  return tx.findOneOrFail(ResearchGroup, { id: groupId }, { lockMode: LockMode.PESSIMISTIC_WRITE, refresh: true });
}

/** A group without a principal investigator could never be managed again. Call it with the lock held, after the change. */
export async function demandInvestigator(tx: EntityManager, groupId: string): Promise<void> {
  const left = await tx.count(Membership, { group: groupId, role: 'pi' });
  if (left === 0)
    throw new Refusal('conflict', 'A group needs a principal investigator: make somebody else one first.');
}
