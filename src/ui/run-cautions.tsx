'use client';

import { useQuery } from '@tanstack/react-query';
import type { RunSummary } from '@/entities/run-summary';
import type { RunItem } from '@/src/runs/schema';
import { Notice } from './notice';
import { useRunSource } from './run-source';
import { apiGet } from './run-api';
import { runCautions } from './run-caution-sentences';
import { inputsOf } from './run-inputs-of';

type SmallestGrain = { items: { radiusUm: number }[] };

export function RunCautions({ run, summary }: { run: RunItem; summary: RunSummary }) {
  const { base } = useRunSource(run.id);
  const path = `${base}/grains?sort=radiusUm&order=asc&limit=1`;
  const { data } = useQuery({
    queryKey: ['smallest-grain', base],
    queryFn: ({ signal }) => apiGet<SmallestGrain>(path, signal),
    staleTime: Infinity,
  });
  const cautions = runCautions(summary, inputsOf(run), data?.items[0]?.radiusUm ?? null);
  return (
    <Notice kind="caution" title="Bear in mind">
      <ul className="grid list-disc gap-1 pl-5">
        {cautions.map((caution) => (
          <li key={caution}>{caution}</li>
        ))}
      </ul>
    </Notice>
  );
}
