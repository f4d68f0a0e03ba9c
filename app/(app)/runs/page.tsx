import type { Metadata } from 'next';
import { listRuns } from '@/src/runs/find-runs';
import { EmptyState } from '@/src/ui/empty-state';
import { LinkButton } from '@/src/ui/link-button';
import { PageHeader } from '@/src/ui/page-header';
import { RunList } from '@/src/ui/run-list';
import { pageActor, pageEm } from '@/src/web/page';

export const metadata: Metadata = { title: 'Runs' };

const perPage = 50;

export default async function RunsPage({ searchParams }: { searchParams: Promise<{ after?: string }> }) {
  const actor = await pageActor();
  const { after } = await searchParams;
  const page = await listRuns(await pageEm(), actor, { limit: perPage, after });
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
