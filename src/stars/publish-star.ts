import type { EntityManager } from '@mikro-orm/postgresql';
import { StarVersion } from '@/entities';
import type { Actor } from '@/src/access/actor';
import { recordChange } from '@/src/audit/record-change';
import { Refusal } from '@/src/errors';
import { demandManage, visibleVersion } from './manageable-star';

type Step = { from: 'draft' | 'published'; to: 'published' | 'retired'; action: string; refusal: string };

const publishing: Step = {
  from: 'draft',
  to: 'published',
  action: 'star.publish',
  refusal: 'This version is not a draft any more: somebody else published it.',
};
const retiring: Step = {
  from: 'published',
  to: 'retired',
  action: 'star.retire',
  refusal: 'Only a published version can be retired.',
};

/** From now on runs get this version; it cannot be changed any more. Of two who publish at once one does. */
export const publishStar = (em: EntityManager, actor: Actor, id: string) => take(em, actor, id, publishing);

/** No new run gets this version; runs that have it keep it. */
export const retireStar = (em: EntityManager, actor: Actor, id: string) => take(em, actor, id, retiring);

async function take(em: EntityManager, actor: Actor, id: string, { from, to, action, refusal }: Step): Promise<void> {
  const version = await visibleVersion(em, actor, id);
  demandManage(actor, version.star);
  await em.transactional(async (tx) => {
    const now = to === 'published' ? { publishedAt: new Date() } : {};
    if ((await tx.nativeUpdate(StarVersion, { id, status: from }, { status: to, ...now })) === 0)
      throw new Refusal('conflict', refusal);
    recordChange(tx, actor, {
      action,
      target: { kind: 'star', id, name: version.name },
      groupId: version.star.group?.id ?? null,
      before: { status: from },
      after: { status: to, version: version.version },
    });
  });
}
