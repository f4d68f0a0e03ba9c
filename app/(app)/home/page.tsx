import type { Metadata } from 'next';
import Link from 'next/link';
import { may } from '@/src/access/policy';
import { listCatalogues } from '@/src/catalogues/find-catalogues';
import { listRuns } from '@/src/runs/find-runs';
import { CatalogueTable } from '@/src/ui/catalogue-table';
import { EmptyState } from '@/src/ui/empty-state';
import { LinkButton } from '@/src/ui/link-button';
import { NoGroup } from '@/src/ui/no-group';
import { PageHeader } from '@/src/ui/page-header';
import { RunList } from '@/src/ui/run-list';
import { RunSection } from '@/src/ui/run-section';
import { pageActor, pageEm } from '@/src/web/page';

export const metadata: Metadata = { title: 'Home' };

const shown = 5;

export default async function HomePage() {
  const actor = await pageActor();
  if (!may(actor, 'catalogue.read')) return <NoGroup title={`Welcome, ${actor.name}`} />;
  const em = await pageEm();
  const catalogues = await listCatalogues(em, actor, { limit: shown });
  const runs = await listRuns(em, actor, { limit: shown });
  const actions = (
    <>
      {may(actor, 'catalogue.upload') && <LinkButton href="/catalogues/new">New catalogue</LinkButton>}
      {catalogues.items.length > 0 && (
        <LinkButton href="/runs/new" variant="primary">
          New run
        </LinkButton>
      )}
    </>
  );
  return (
    <>
      <PageHeader
        title={actor.groupName ?? 'Home'}
        subtitle="Which grains does starlight blow out?"
        actions={actions}
      />
      {catalogues.items.length === 0 ? (
        <EmptyState
          title="Begin with a catalogue"
          action={
            <div className="flex flex-wrap gap-3">
              {may(actor, 'catalogue.upload') && (
                <LinkButton href="/catalogues/new" variant="primary">
                  Upload a catalogue
                </LinkButton>
              )}
              <LinkButton href="/calculator">Try the calculator first</LinkButton>
            </div>
          }
        >
          Upload a CSV file with one row per grain: radius, density, material, and errors where you have them. Then
          choose a star and see what its light removes.
        </EmptyState>
      ) : (
        <div className="grid gap-12">
          <RunSection id="runs" title="Latest runs">
            {runs.items.length > 0 ? (
              <RunList initial={{ ...runs, next: null }} limit={shown} />
            ) : (
              <p className="text-muted">No runs yet.</p>
            )}
            <p className="mt-3">
              <Link href="/runs" className="prose-link">
                All runs
              </Link>
            </p>
          </RunSection>
          <RunSection id="catalogues" title="Latest catalogues">
            <CatalogueTable items={catalogues.items} />
            <p className="mt-3">
              <Link href="/catalogues" className="prose-link">
                All catalogues
              </Link>
            </p>
          </RunSection>
        </div>
      )}
    </>
  );
}
