'use client';

import { useQuery } from '@tanstack/react-query';
import Link from 'next/link';
import type { RunItem } from '@/src/runs/schema';
import { apiGet, worthAskingAgain } from './run-api';
import { isUnderWay } from './run-live';
import { RunRow } from './run-row';

type RunPage = { items: RunItem[]; next: string | null };

const askEveryMs = 2000;
const columns = ['Run', 'Catalogue', 'Star', 'Status', 'Unbound, by number', 'Requested', 'By'];

type Props = { initial: RunPage; after?: string; catalogueId?: string; limit?: number };

export function RunList({ initial, after, catalogueId, limit = 50 }: Props) {
  const query = new URLSearchParams({
    limit: String(limit),
    ...(after ? { after } : {}),
    ...(catalogueId ? { catalogueId } : {}),
  });
  const path = `/api/v1/runs?${query}`;
  const { data } = useQuery({
    queryKey: ['runs', path],
    queryFn: ({ signal }) => apiGet<RunPage>(path, signal),
    initialData: initial,
    refetchOnMount: false,
    refetchInterval: ({ state }) => (state.data?.items.some(isUnderWay) ? askEveryMs : false),
    retry: worthAskingAgain,
  });
  return (
    <>
      <div className="overflow-x-auto" tabIndex={0} role="region" aria-label="Runs">
        <table className="w-full min-w-[52rem] text-sm">
          <caption className="sr-only">Runs, newest first</caption>
          <thead>
            <tr className="text-muted">
              {columns.map((column, index) => (
                <th
                  key={column}
                  scope="col"
                  className={`py-1.5 font-medium ${index === 4 ? 'pr-8 text-right' : 'pr-4 text-left'}`}
                >
                  {column}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {data.items.map((run) => (
              <RunRow key={run.id} run={run} />
            ))}
          </tbody>
        </table>
      </div>
      <nav className="mt-4 flex gap-6" aria-label="Pages of runs">
        {after && (
          <Link href="/runs" className="underline">
            Newest
          </Link>
        )}
        {data.next && (
          <Link href={`/runs?after=${encodeURIComponent(data.next)}`} className="underline">
            Older runs
          </Link>
        )}
      </nav>
    </>
  );
}
