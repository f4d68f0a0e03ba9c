import type { Metadata } from 'next';
import type { EntityManager } from '@mikro-orm/postgresql';
import type { Actor } from '@/src/access/actor';
import { may } from '@/src/access/policy';
import { listCatalogues } from '@/src/catalogues/find-catalogues';
import { listMaterials } from '@/src/materials/find-materials';
import { findRun } from '@/src/runs/find-runs';
import { listStars } from '@/src/stars/find-stars';
import { NoGroup } from '@/src/ui/no-group';
import { PageHeader } from '@/src/ui/page-header';
import { emptyDraft, type RunDraft } from '@/src/ui/run-draft';
import { draftOfInputs } from '@/src/ui/run-draft-of-inputs';
import { RunForm } from '@/src/ui/run-form';
import { inputsOf } from '@/src/ui/run-inputs-of';
import { orNotFound, pageActor, pageEm } from '@/src/web/page';
import { idOrNowhere, onlyOne } from '../../nowhere';
import { requestRunAction } from './actions';

export const metadata: Metadata = { title: 'New run' };

const shownCatalogues = 200;

type Query = { catalogueId?: string | string[]; from?: string | string[] };

export default async function NewRunPage({ searchParams }: { searchParams: Promise<Query> }) {
  const actor = await pageActor();
  if (!may(actor, 'run.request')) return <NoGroup title="New run" />;
  const em = await pageEm();
  const { items: catalogues } = await listCatalogues(em, actor, { limit: shownCatalogues });
  const { items: stars } = await listStars(em, actor);
  const { items: materials } = await listMaterials(em, actor);
  const initial = await draftOf(em, actor, await searchParams, stars[0]?.slug ?? '');
  return (
    <>
      <PageHeader
        title="New run"
        subtitle="One star, one way of letting the grains go: which of them does the light remove?"
      />
      <RunForm
        action={requestRunAction}
        initial={initial}
        catalogues={catalogues}
        stars={stars}
        materials={materials}
      />
    </>
  );
}

async function draftOf(em: EntityManager, actor: Actor, { from, catalogueId }: Query, star: string): Promise<RunDraft> {
  const earlier = onlyOne(from);
  if (!earlier) return { ...emptyDraft, star, catalogueId: onlyOne(catalogueId) ?? '' };
  const run = await orNotFound(findRun(em, actor, idOrNowhere(earlier)));
  return draftOfInputs(inputsOf(run), run.name);
}
