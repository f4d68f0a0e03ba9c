'use client';

import { useQuery } from '@tanstack/react-query';
import type { CatalogueItem } from '@/src/catalogues/schema';
import { LinkButton } from '@/src/ui/link-button';
import { Notice } from '@/src/ui/notice';
import { apiGet, worthAskingAgain } from '@/src/ui/run-api';
import { RunSection } from '@/src/ui/run-section';
import { CatalogueFacts } from './catalogue-facts';
import { CatalogueGrains } from './catalogue-grains';
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
  const { id, status, failure, warnings, rows } = catalogue;
  return (
    <div className="grid gap-10">
      <div className="grid gap-4" role="status">
        {status === 'checking' && (
          <Notice
            kind="info"
            title="The catalogue is being checked"
          >{`${rows.checked.toLocaleString('en-US')} rows read so far.`}</Notice>
        )}
        {status === 'failed' && (
          <Notice kind="danger" title="This catalogue was not accepted">
            {failure}
          </Notice>
        )}
        {warnings.map((warning) => (
          <Notice key={warning} kind="caution">
            {warning}
          </Notice>
        ))}
      </div>
      {status === 'ready' && (
        <div className="flex flex-wrap gap-3">
          <LinkButton href={`/runs/new?catalogueId=${id}`} variant="primary">
            Start a run with this catalogue
          </LinkButton>
          <LinkButton href={`/api/v1/catalogues/${id}/original`} download>
            Download the original file
          </LinkButton>
        </div>
      )}
      {status === 'failed' && (
        <div className="flex flex-wrap gap-3">
          <LinkButton href="/catalogues/new" variant="primary">
            Upload a corrected file
          </LinkButton>
          <LinkButton href={`/api/v1/catalogues/${id}/original`} download>
            Download the original file
          </LinkButton>
        </div>
      )}
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
