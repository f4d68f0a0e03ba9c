'use client';

import type { RunSummary } from '@/entities/run-summary';
import type { RunItem } from '@/src/runs/schema';
import { RunCautions } from './run-cautions';
import { RunDownloads } from './run-downloads';
import { RunGrains } from './run-grains';
import { RunInputsList } from './run-inputs-list';
import { RunMaterials } from './run-materials';
import { RunPlots } from './run-plots';
import { RunProvenance } from './run-provenance';

export function RunResults({ run, summary }: { run: RunItem; summary: RunSummary }) {
  return (
    <div className="mt-8 grid gap-10">
      <RunDownloads run={run} />
      <RunCautions run={run} summary={summary} />
      <RunPlots run={run} summary={summary} />
      <RunMaterials materials={summary.perMaterial} />
      <RunGrains run={run} summary={summary} />
      <div className="grid gap-10 lg:grid-cols-2">
        <RunInputsList run={run} />
        <RunProvenance run={run} />
      </div>
    </div>
  );
}
