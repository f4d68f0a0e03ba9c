import type { EntityManager } from '@mikro-orm/postgresql';
import { StarVersion } from '@/entities';
import type { Actor } from '@/src/access/actor';
import { starItemOf } from './find-stars';
import { mayManage, visibleStar } from './manageable-star';
import type { StarItem } from './schema';

/** All versions of a star, newest first; drafts for those who may publish them. */
export async function starHistory(
  em: EntityManager,
  actor: Actor,
  slug: string,
): Promise<{ versions: StarItem[]; manages: boolean }> {
  const star = await visibleStar(em, actor, slug);
  const manages = mayManage(actor, star);
  const rows = await em.find(
    StarVersion,
    { star: star.id, ...(manages ? {} : { status: { $ne: 'draft' as const } }) },
    { populate: ['star'], orderBy: { version: 'desc' } },
  );
  return { versions: rows.map(starItemOf), manages };
}
