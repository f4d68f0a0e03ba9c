import type { EntityManager } from '@mikro-orm/postgresql';
import { StarVersion } from '@/entities';
import type { FrozenStar } from '@/entities/run-inputs';
import { visiblePresets } from '@/src/access/policy';
import { Refusal } from '@/src/errors';
import { currentStars, type CurrentStar } from './current-stars';
import type { StarNumbers } from './schema';

export type StarChoice = { starId?: string; starSlug?: string; star?: StarNumbers };

/** A star by the id of one of its versions, the newest version by slug, or numbers of the person's own. */
export async function resolveStar(em: EntityManager, groupId: string | null, choice: StarChoice): Promise<FrozenStar> {
  if (choice.star) return ownStar(choice.star);
  if (choice.starId !== undefined) {
    const version = await em.findOne(
      StarVersion,
      { id: choice.starId, status: { $ne: 'draft' }, star: visiblePresets(groupId) },
      { populate: ['star'] },
    );
    if (!version) throw unknownStar('/starId', choice.starId);
    return frozenStar(version);
  }
  const slug = choice.starSlug ?? '';
  const version = (await currentStars(em, groupId)).get(slug.trim().toLowerCase());
  if (!version) throw unknownStar('/starSlug', slug);
  return frozenStar(version);
}

const unknownStar = (pointer: string, name: string) =>
  new Refusal('unprocessable', `There is no star preset "${name}".`, [{ pointer, detail: 'is not a star preset' }]);

const ownStar = (numbers: StarNumbers): FrozenStar => ({
  slug: null,
  version: null,
  name: 'Own numbers',
  ...numbers,
  radiusSun: null,
  spectrum: null,
  citation: 'Given with the request.',
});

const frozenStar = (version: CurrentStar): FrozenStar => ({
  slug: version.star.slug,
  version: version.version,
  name: version.name,
  massSun: version.massSun,
  luminositySun: version.luminositySun,
  teffK: version.teffK,
  radiusSun: version.radiusSun ?? null,
  spectrum: version.spectrum ?? null,
  citation: version.citation,
});
