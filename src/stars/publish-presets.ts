import type { EntityManager } from '@mikro-orm/postgresql';
import { Star, StarVersion } from '@/entities';
import type { StarPreset } from '@/fixtures/stars';

/** Puts the presets that come with the product in place; one that is there is left as it is. */
export async function publishShippedStars(em: EntityManager, presets: readonly StarPreset[]): Promise<void> {
  await em.transactional(async (tx) => {
    const present = new Set((await tx.find(Star, { group: null })).map(({ slug }) => slug));
    for (const { slug, ...numbers } of presets) {
      if (present.has(slug)) continue;
      const star = tx.create(Star, { slug });
      tx.create(StarVersion, { star, version: 1, status: 'published', publishedAt: new Date(), ...numbers });
    }
  });
}
