import type { EntityManager, Loaded } from '@mikro-orm/postgresql';
import { Star, StarVersion } from '@/entities';
import type { Actor } from '@/src/access/actor';
import { demand, may, visiblePresets } from '@/src/access/policy';
import { notFound } from '@/src/errors';

/** Whether the person may change this star: administrators everybody's, principal investigators the own group's. */
export function mayManage(actor: Actor, star: Star): boolean {
  if (star.group === null || star.group === undefined) return may(actor, 'star.manageShared');
  return star.group.id === actor.groupId && may(actor, 'star.manageOwn');
}

export function demandManage(actor: Actor, star: Star): void {
  if (!mayManage(actor, star)) demand(actor, star.group ? 'star.manageOwn' : 'star.manageShared');
}

/** A star by slug; the group's own goes before everybody's. */
export async function visibleStar(em: EntityManager, actor: Actor, slug: string): Promise<Star> {
  demand(actor, 'star.read');
  const found = await em.find(Star, { slug, ...visiblePresets(actor.groupId) });
  const star = found.find(({ group }) => group) ?? found[0];
  if (!star) throw notFound('star');
  return star;
}

export async function visibleVersion(
  em: EntityManager,
  actor: Actor,
  id: string,
): Promise<Loaded<StarVersion, 'star'>> {
  demand(actor, 'star.read');
  const version = await em.findOne(
    StarVersion,
    { id, star: visiblePresets(actor.groupId) },
    { populate: ['star'], refresh: true },
  );
  if (!version || (version.status === 'draft' && !mayManage(actor, version.star))) throw notFound('star');
  return version;
}
