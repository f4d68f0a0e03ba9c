'use client';

import { useMemo } from 'react';
import type { RunSummary } from '@/entities/run-summary';
import type { RunItem } from '@/src/runs/schema';
import { ServerGrid } from './grid/server-grid';
import { runGrainColumns, runGrainFilters } from './run-grain-columns';
import { inputsOf } from './run-inputs-of';
import { useRunSource } from './run-source';
import { RunSection } from './run-section';

const highestBetaFirst = { field: 'beta', order: 'desc' } as const;

export function RunGrains({ run, summary }: { run: RunItem; summary: RunSummary }) {
  const { base } = useRunSource(run.id);
  const columns = useMemo(() => runGrainColumns(summary, inputsOf(run)), [summary, run]);
  const filters = useMemo(() => runGrainFilters(summary), [summary]);
  return (
    <RunSection id="grains" title="Grains">
      <ServerGrid
        endpoint={`${base}/grains`}
        columns={columns}
        filters={filters}
        initialSort={highestBetaFirst}
        label="Grains of this run"
      />
      <p className="text-muted mt-2 text-sm">
        A dash means that the quantity does not exist: an unbound grain has no new orbit and no drag time, a bound grain
        has no speed far away.
      </p>
    </RunSection>
  );
}
