import type { EntityManager, Loaded } from '@mikro-orm/postgresql';
import { StarVersion } from '@/entities';
import { visiblePresets } from '@/src/access/policy';

export type CurrentStar = Loaded<StarVersion, 'star'>;

/** The newest published version of every star that the group may see, by slug; a group's own goes before everybody's. */
export async function currentStars(em: EntityManager, groupId: string | null): Promise<Map<string, CurrentStar>> {
  const versions = await em.find(
    StarVersion,
    { status: 'published', star: visiblePresets(groupId) },
    { populate: ['star'], orderBy: { version: 'asc' } },
  );
  const ownLast = versions.sort((a, b) => Number(a.star.group !== null) - Number(b.star.group !== null));
  return new Map(ownLast.map((version) => [version.star.slug, version]));
}
