import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { may } from '@/src/access/policy';
import { findCatalogue } from '@/src/catalogues/find-catalogues';
import { listRuns } from '@/src/runs/find-runs';
import { PageHeader } from '@/src/ui/page-header';
import { RunList } from '@/src/ui/run-list';
import { RunSection } from '@/src/ui/run-section';
import { orNotFound, pageActor, pageEm } from '@/src/web/page';
import { idOrNowhere } from '../../nowhere';
import { CatalogueLive } from './catalogue-live';

type Props = { params: Promise<{ id: string }> };

const shownRuns = 20;

async function catalogueOf({ params }: Props) {
  const actor = await pageActor();
  if (!may(actor, 'catalogue.read')) notFound();
  const id = idOrNowhere((await params).id);
  return orNotFound(findCatalogue(await pageEm(), actor, id));
}

export async function generateMetadata(props: Props): Promise<Metadata> {
  return { title: (await catalogueOf(props)).name };
}

export default async function CataloguePage(props: Props) {
  const catalogue = await catalogueOf(props);
  const runs = await listRuns(await pageEm(), await pageActor(), { catalogueId: catalogue.id, limit: shownRuns });
  return (
    <>
      <PageHeader title={catalogue.name} subtitle={`Uploaded by ${catalogue.uploadedBy} as ${catalogue.fileName}`} />
      <div className="grid gap-12">
        <CatalogueLive initial={catalogue} />
        {runs.items.length > 0 && (
          <RunSection id="runs" title="Runs of this catalogue">
            <RunList initial={{ ...runs, next: null }} catalogueId={catalogue.id} />
          </RunSection>
        )}
      </div>
    </>
  );
}
