'use client';

import { useInfiniteQuery } from '@tanstack/react-query';
import type { RejectItem } from '@/src/catalogues/schema';
import { Button } from '@/src/ui/button';
import { DataTable, type DataColumn } from '@/src/ui/data-table';
import { LinkButton } from '@/src/ui/link-button';
import { Notice } from '@/src/ui/notice';
import { apiGet, sayProblem, worthAskingAgain } from '@/src/ui/run-api';
import { RunSection } from '@/src/ui/run-section';

type Page = { items: RejectItem[]; next: string | null; total: number };

const perPage = 25;

const columns: DataColumn<RejectItem>[] = [
  { header: 'Line', show: ({ line }) => <span className="whitespace-nowrap tabular-nums">Line {line}</span> },
  { header: 'Column', show: ({ column }) => <span className="font-mono break-all">{column ?? '—'}</span> },
  {
    header: 'Value',
    show: ({ value }) => <span className="block max-w-64 font-mono break-all">{value ?? '—'}</span>,
  },
  { header: 'Reason', show: ({ reason }) => reason },
];

/** The rows that were not accepted: where, what was seen, and why. */
export function RejectTable({ catalogueId, rejectedRows }: { catalogueId: string; rejectedRows: number }) {
  const path = `/api/v1/catalogues/${catalogueId}/rejects`;
  const { data, error, hasNextPage, fetchNextPage, isFetchingNextPage } = useInfiniteQuery({
    queryKey: ['rejects', catalogueId],
    queryFn: ({ pageParam, signal }) =>
      apiGet<Page>(`${path}?limit=${perPage}${pageParam ? `&after=${encodeURIComponent(pageParam)}` : ''}`, signal),
    initialPageParam: '',
    getNextPageParam: ({ next }) => next ?? undefined,
    retry: worthAskingAgain,
  });
  const items = data?.pages.flatMap((page) => page.items) ?? [];
  return (
    <RunSection id="rejects" title={`Rows that were not accepted: ${rejectedRows.toLocaleString('en-US')}`}>
      <div className="mb-4">
        <LinkButton href={`${path}.csv`} download size="small">
          Download the list (CSV)
        </LinkButton>
      </div>
      {items.length > 0 && (
        <DataTable
          caption="Rows that were not accepted"
          columns={columns}
          rows={items}
          rowKey={({ ordinal }) => String(ordinal)}
          minWidth="sm:min-w-[40rem]"
        />
      )}
      {error !== null && <Notice kind="danger">{sayProblem(error)}</Notice>}
      {hasNextPage && (
        <div className="mt-4 flex flex-wrap items-center gap-3">
          <Button size="small" onClick={() => void fetchNextPage()} disabled={isFetchingNextPage}>
            Show more
          </Button>
          <p className="text-muted text-sm" role="status">
            The first {items.length} are shown.
          </p>
        </div>
      )}
    </RunSection>
  );
}
