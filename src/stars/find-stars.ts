import type { EntityManager } from '@mikro-orm/postgresql';
import type { Actor } from '@/src/access/actor';
import type { Page } from '@/src/access/page';
import { demand } from '@/src/access/policy';
import { currentStars, type CurrentStar } from './current-stars';
import type { StarItem } from './schema';

/** The Sun first, then by falling luminosity. */
export async function listStars(em: EntityManager, actor: Actor): Promise<Page<StarItem>> {
  demand(actor, 'star.read');
  const items = [...(await currentStars(em, actor.groupId)).values()].map(starItemOf);
  items.sort((a, b) => Number(b.slug === 'sun') - Number(a.slug === 'sun') || b.luminositySun - a.luminositySun);
  return { items, next: null };
}

export function starItemOf(version: CurrentStar): StarItem {
  return {
    id: version.id,
    slug: version.star.slug,
    version: version.version,
    name: version.name,
    spectralType: version.spectralType ?? null,
    massSun: version.massSun,
    luminositySun: version.luminositySun,
    teffK: version.teffK,
    radiusSun: version.radiusSun ?? null,
    spectrum: version.spectrum ? 'table' : 'blackbody',
    citation: version.citation,
    note: version.note,
    status: version.status,
    ownedBy: version.star.group === null ? 'everybody' : 'group',
  };
}
