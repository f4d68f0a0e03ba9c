import type { Metadata } from 'next';
import { may } from '@/src/access/policy';
import { listRuns } from '@/src/runs/find-runs';
import { EmptyState } from '@/src/ui/empty-state';
import { LinkButton } from '@/src/ui/link-button';
import { NoGroup } from '@/src/ui/no-group';
import { PageHeader } from '@/src/ui/page-header';
import { RunList } from '@/src/ui/run-list';
import { pageActor, pageEm } from '@/src/web/page';
import { onlyOne, orNowhere } from '../nowhere';

export const metadata: Metadata = { title: 'Runs' };

const perPage = 50;

export default async function RunsPage({ searchParams }: { searchParams: Promise<{ after?: string | string[] }> }) {
  const actor = await pageActor();
  if (!may(actor, 'run.read')) return <NoGroup title="Runs" />;
  const after = onlyOne((await searchParams).after);
  const page = await orNowhere(listRuns(await pageEm(), actor, { limit: perPage, after }));
  return (
    <>
      <PageHeader
        title="Runs"
        subtitle="Each run is one catalogue, one star and one release, frozen by value."
        actions={newRun}
      />
      {page.items.length === 0 && !after ? (
        <EmptyState title="No runs yet" action={newRun}>
          A run says which grains of a catalogue the light of a star removes.
        </EmptyState>
      ) : (
        <RunList initial={page} after={after} />
      )}
    </>
  );
}

const newRun = (
  <LinkButton href="/runs/new" variant="primary">
    New run
  </LinkButton>
);
