import type { EntityManager } from '@mikro-orm/postgresql';
import { Run } from '@/entities';
import type { Actor } from '@/src/access/actor';
import { demand, ofOwnGroup } from '@/src/access/policy';
import { recordChange } from '@/src/audit/record-change';
import { Refusal } from '@/src/errors';
import { ownRun } from './find-runs';

/** Ends a run that has not ended; its worker notices within a second and nothing of it is stored. */
export async function cancelRun(
  em: EntityManager,
  actor: Actor,
  id: string,
): Promise<{ id: string; status: 'cancelled' }> {
  demand(actor, 'run.cancel');
  const changed = await em.transactional((tx) => cancelled(tx, actor, id));
  if (changed) return { id, status: 'cancelled' };
  const run = await ownRun(em, actor, id);
  if (run.status === 'cancelled') return { id, status: 'cancelled' };
  throw new Refusal('conflict', `This run has already ended: it is ${run.status}.`);
}

async function cancelled(tx: EntityManager, actor: Actor, id: string): Promise<boolean> {
  const changed = await tx.nativeUpdate(
    Run,
    { id, ...ofOwnGroup(actor), status: { $in: ['queued', 'running'] } },
    { status: 'cancelled', stage: 'Cancelled', claim: null, finishedAt: new Date() },
  );
  if (changed === 0) return false;
  recordChange(tx, actor, { action: 'run.cancel', target: { kind: 'run', id }, groupId: actor.groupId });
  return true;
}
