'use client';

import { useQuery } from '@tanstack/react-query';
import type { CatalogueItem } from '@/src/catalogues/schema';
import { apiGet, worthAskingAgain } from '@/src/ui/run-api';
import { RunSection } from '@/src/ui/run-section';
import { CatalogueActions } from './catalogue-actions';
import { CatalogueFacts } from './catalogue-facts';
import { CatalogueGrains } from './catalogue-grains';
import { CatalogueStatus } from './catalogue-status';
import { RejectTable } from './reject-table';

const askEveryMs = 700;

/** A catalogue as it is now: asks while it is being checked, then shows what became of it without a reload. */
export function CatalogueLive({ initial }: { initial: CatalogueItem }) {
  const { data: catalogue } = useQuery({
    queryKey: ['catalogue', initial.id],
    queryFn: ({ signal }) => apiGet<CatalogueItem>(`/api/v1/catalogues/${initial.id}`, signal),
    initialData: initial,
    refetchInterval: ({ state }) => (state.data?.status === 'checking' ? askEveryMs : false),
    refetchOnMount: false,
    retry: worthAskingAgain,
  });
  const { id, status, rows } = catalogue;
  return (
    <div className="grid gap-10">
      <div className="grid">
        <CatalogueStatus catalogue={catalogue} />
        <CatalogueActions id={id} status={status} />
      </div>
      {status !== 'checking' && rows.rejected > 0 && <RejectTable catalogueId={id} rejectedRows={rows.rejected} />}
      {status === 'ready' && (
        <RunSection id="grains" title="Grains">
          <CatalogueGrains catalogue={catalogue} />
        </RunSection>
      )}
      <RunSection id="facts" title="What was uploaded">
        <CatalogueFacts catalogue={catalogue} />
      </RunSection>
    </div>
  );
}
