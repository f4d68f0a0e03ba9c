import type { RunItem } from '@/src/runs/schema';
import { LinkButton } from './link-button';

export function RunDownloads({ run }: { run: RunItem }) {
  return (
    <div className="flex flex-wrap gap-3">
      <LinkButton href={`/api/v1/runs/${run.id}/export.csv`} variant="primary" download>
        Download all grains (CSV)
      </LinkButton>
      <LinkButton href={`/runs/new?from=${run.id}`} variant="secondary">
        Run again with changes
      </LinkButton>
    </div>
  );
}
