import type { EntityManager } from '@mikro-orm/postgresql';
import type { FrozenStar } from '@/entities/run-inputs';
import type { Actor } from '@/src/access/actor';
import { currentStars } from './current-stars';

/** The version that a new run would get, when it is newer than the one that was frozen. */
export async function newerVersion(
  em: EntityManager,
  actor: Actor,
  { slug, version }: Pick<FrozenStar, 'slug' | 'version'>,
): Promise<number | null> {
  if (slug === null || version === null) return null;
  const current = (await currentStars(em, actor.groupId)).get(slug);
  return current && current.version > version ? current.version : null;
}
