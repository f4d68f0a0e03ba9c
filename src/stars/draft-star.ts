import { UniqueConstraintViolationException, type EntityManager } from '@mikro-orm/postgresql';
import { Star, StarVersion } from '@/entities';
import type { Actor } from '@/src/access/actor';
import { demand } from '@/src/access/policy';
import { recordChange } from '@/src/audit/record-change';
import { Refusal } from '@/src/errors';
import { demandManage, visibleStar, visibleVersion } from './manageable-star';
import type { NewStar, StarDraft } from './star-draft-schema';

type Drafted = { id: string; slug: string };

const columnsOf = ({ spectralType, radiusSun, ...others }: StarDraft) => ({
  ...others,
  spectralType: spectralType || null,
  radiusSun: radiusSun ?? null,
});

/** A new star as a draft: nobody sees it before it is published. */
export async function draftNewStar(
  em: EntityManager,
  actor: Actor,
  { slug, owner, ...draft }: NewStar,
): Promise<Drafted> {
  demand(actor, owner === 'group' ? 'star.manageOwn' : 'star.manageShared');
  return refusingDoubles(em, async (tx) => {
    const star = tx.create(Star, { slug, group: owner === 'group' ? actor.groupId : null });
    return createDraft(tx, actor, star, 1, draft);
  });
}

/** The next version of a star; one draft at a time. */
export async function draftNextVersion(em: EntityManager, actor: Actor, slug: string): Promise<Drafted> {
  const star = await visibleStar(em, actor, slug);
  demandManage(actor, star);
  return refusingDoubles(em, async (tx) => {
    const [newest] = await tx.find(StarVersion, { star: star.id }, { orderBy: { version: 'desc' }, limit: 1 });
    if (!newest) throw new Error(`the star ${slug} has no version`);
    if (newest.status === 'draft')
      throw new Refusal('conflict', 'There is a draft of this star already: go on with that one.');
    const { name, spectralType, massSun, luminositySun, teffK, radiusSun, citation, note } = newest;
    const copy = {
      name,
      massSun,
      luminositySun,
      teffK,
      citation,
      note,
      spectralType: spectralType ?? undefined,
      radiusSun: radiusSun ?? undefined,
    };
    return createDraft(
      tx,
      actor,
      tx.getReference(Star, star.id),
      newest.version + 1,
      copy,
      slug,
      newest.spectrum ?? null,
    );
  });
}

export async function editDraft(em: EntityManager, actor: Actor, id: string, draft: StarDraft): Promise<void> {
  const version = await visibleVersion(em, actor, id);
  demandManage(actor, version.star);
  await em.transactional(async (tx) => {
    const changed = await tx.nativeUpdate(StarVersion, { id, status: 'draft' }, columnsOf(draft));
    if (changed === 0)
      throw new Refusal('conflict', 'This version is published: it cannot be changed any more. Draft a new one.');
    recordChange(tx, actor, {
      action: 'star.edit',
      target: { kind: 'star', id, name: draft.name },
      groupId: version.star.group?.id ?? null,
      before: numbersOf(version),
      after: numbersOf(draft),
    });
  });
}

const numbersOf = ({ massSun, luminositySun, teffK }: Pick<StarDraft, 'massSun' | 'luminositySun' | 'teffK'>) => ({
  massSun,
  luminositySun,
  teffK,
});

async function createDraft(
  tx: EntityManager,
  actor: Actor,
  star: Star,
  version: number,
  draft: StarDraft,
  slug = star.slug,
  spectrum: StarVersion['spectrum'] = null,
): Promise<Drafted> {
  const row = tx.create(StarVersion, {
    star,
    version,
    status: 'draft',
    createdBy: actor.personId,
    spectrum,
    ...columnsOf(draft),
  });
  await tx.flush();
  recordChange(tx, actor, {
    action: 'star.draft',
    target: { kind: 'star', id: row.id, name: draft.name },
    groupId: star.group?.id ?? null,
    after: { version, ...numbersOf(draft) },
  });
  await tx.flush();
  return { id: row.id, slug };
}

async function refusingDoubles<T>(em: EntityManager, work: (tx: EntityManager) => Promise<T>): Promise<T> {
  try {
    return await em.transactional(work);
  } catch (error) {
    if (!(error instanceof UniqueConstraintViolationException)) throw error;
    const detail = 'is taken, or somebody else is drafting this star at this moment';
    throw new Refusal('conflict', 'There is such a star or draft already.', [{ pointer: '/slug', detail }]);
  }
}
