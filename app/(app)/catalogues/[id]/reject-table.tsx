'use client';

import { useInfiniteQuery } from '@tanstack/react-query';
import type { RejectItem } from '@/src/catalogues/schema';
import { Button } from '@/src/ui/button';
import { LinkButton } from '@/src/ui/link-button';
import { apiGet, worthAskingAgain } from '@/src/ui/run-api';
import { RunSection } from '@/src/ui/run-section';

type Page = { items: RejectItem[]; next: string | null; total: number };

const perPage = 25;

/** The rows that were not accepted: where, what was seen, and why. */
export function RejectTable({ catalogueId, rejectedRows }: { catalogueId: string; rejectedRows: number }) {
  const { data, hasNextPage, fetchNextPage, isFetchingNextPage } = useInfiniteQuery({
    queryKey: ['rejects', catalogueId],
    queryFn: ({ pageParam, signal }) =>
      apiGet<Page>(
        `/api/v1/catalogues/${catalogueId}/rejects?limit=${perPage}${pageParam ? `&after=${encodeURIComponent(pageParam)}` : ''}`,
        signal,
      ),
    initialPageParam: '',
    getNextPageParam: ({ next }) => next ?? undefined,
    retry: worthAskingAgain,
  });
  const items = data?.pages.flatMap((page) => page.items) ?? [];
  return (
    <RunSection id="rejects" title={`Rows that were not accepted: ${rejectedRows.toLocaleString('en-US')}`}>
      <div className="mb-4">
        <LinkButton href={`/api/v1/catalogues/${catalogueId}/rejects.csv`} download size="small">
          Download the list (CSV)
        </LinkButton>
      </div>
      <div className="overflow-x-auto" tabIndex={0} role="region" aria-label="Rejected rows">
        <table className="w-full min-w-[40rem] text-sm">
          <caption className="sr-only">Rejected rows with line, column, value and reason</caption>
          <thead className="text-muted text-left">
            <tr>
              <th scope="col" className="w-px py-1.5 pr-6 text-right font-medium">
                Line
              </th>
              <th scope="col" className="py-1.5 pr-6 font-medium">
                Column
              </th>
              <th scope="col" className="py-1.5 pr-6 font-medium">
                Value
              </th>
              <th scope="col" className="py-1.5 font-medium">
                Reason
              </th>
            </tr>
          </thead>
          <tbody>
            {items.map((item) => (
              <tr key={item.ordinal} className="border-line border-t align-top">
                <td className="py-2 pr-6 text-right font-mono tabular-nums">{item.line}</td>
                <td className="py-2 pr-6 font-mono break-all">{item.column ?? '—'}</td>
                <td className="max-w-64 py-2 pr-6 font-mono break-all">{item.value ?? '—'}</td>
                <td className="py-2">{item.reason}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      {hasNextPage && (
        <div className="mt-4">
          <Button size="small" onClick={() => void fetchNextPage()} disabled={isFetchingNextPage}>
            Show more
          </Button>
        </div>
      )}
    </RunSection>
  );
}
