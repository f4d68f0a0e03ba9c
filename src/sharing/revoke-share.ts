import type { EntityManager } from '@mikro-orm/postgresql';
import { Share } from '@/entities';
import type { Actor } from '@/src/access/actor';
import { demand, ofOwnGroup } from '@/src/access/policy';
import { recordChange } from '@/src/audit/record-change';
import { notFound } from '@/src/errors';

/** From the next request on the link opens nothing: every request reads the row. */
export async function revokeShare(em: EntityManager, actor: Actor, id: string): Promise<void> {
  demand(actor, 'share.manage');
  await em.transactional(async (tx) => {
    const share = await tx.findOne(Share, { id, revokedAt: null, run: ofOwnGroup(actor) }, { populate: ['run'] });
    if (!share) throw notFound('link');
    share.revokedAt = new Date();
    recordChange(tx, actor, {
      action: 'share.revoke',
      target: { kind: 'run', id: share.run.id, name: share.run.name },
      groupId: actor.groupId,
      before: { share: id },
    });
  });
}
