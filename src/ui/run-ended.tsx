import type { RunItem } from '@/src/runs/schema';
import { LinkButton } from './link-button';
import { Notice } from './notice';
import { RunInputsList } from './run-inputs-list';
import { RunProvenance } from './run-provenance';

export function RunFailed({ run }: { run: RunItem }) {
  return (
    <Ended run={run}>
      <Notice kind="danger" title="This run failed">
        <p>{run.error}</p>
        <p className="mt-1">
          Nothing was stored. Change the inputs and run it again; if it fails for the same reason, tell your
          administrator the run number {run.id}.
        </p>
      </Notice>
    </Ended>
  );
}

export function RunCancelled({ run }: { run: RunItem }) {
  return (
    <Ended run={run}>
      <Notice kind="info" title="This run was cancelled">
        <p>It was stopped before it had an answer. Its inputs are kept, so you can run it again.</p>
      </Notice>
    </Ended>
  );
}

function Ended({ run, children }: { run: RunItem; children: React.ReactNode }) {
  return (
    <div className="grid gap-6">
      {children}
      <div>
        <LinkButton href={`/runs/new?from=${run.id}`} variant="primary">
          Run again with changes
        </LinkButton>
      </div>
      <RunInputsList run={run} />
      <RunProvenance run={run} />
    </div>
  );
}
