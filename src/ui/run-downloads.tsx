'use client';

import type { RunItem } from '@/src/runs/schema';
import { LinkButton } from './link-button';
import { useRunSource } from './run-source';

export function RunDownloads({ run }: { run: RunItem }) {
  const { base, isShared, mayDownload } = useRunSource(run.id);
  return (
    <div className="flex flex-wrap gap-3 empty:hidden">
      {mayDownload && (
        <LinkButton href={`${base}/export.csv`} variant="primary" download>
          Download all grains (CSV)
        </LinkButton>
      )}
      {!isShared && (
        <LinkButton href={`/runs/new?from=${run.id}`} variant="secondary">
          Run again with changes
        </LinkButton>
      )}
    </div>
  );
}
