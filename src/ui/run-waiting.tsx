'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import type { RunItem } from '@/src/runs/schema';
import { Button } from './button';
import { Notice } from './notice';
import { ProgressBar } from './progress-bar';
import { apiPost, sayProblem } from './run-api';
import { durationText } from './run-duration';

export function RunWaiting({ run, isOutOfTouch }: { run: RunItem; isOutOfTouch: boolean }) {
  const client = useQueryClient();
  const cancel = useMutation({
    mutationFn: () => apiPost(`/api/v1/runs/${run.id}/cancel`),
    onSettled: () => client.invalidateQueries({ queryKey: ['run', run.id] }),
  });
  const elapsedS = useSecondsSince(run.startedAt ?? run.createdAt);
  const isQueued = run.status === 'queued';
  return (
    <section className="border-line bg-panel grid gap-4 rounded-lg border p-6" aria-label="Progress">
      <p className="font-serif text-2xl">{isQueued ? 'Waiting for a free worker' : run.stage || 'Computing'}</p>
      <ProgressBar value={run.progress} label="Progress of the run" />
      <div className="flex flex-wrap items-center justify-between gap-3">
        <p className="text-muted text-sm tabular-nums">
          {Math.round(run.progress * 100)} % done
          {elapsedS !== null && `, ${durationText(elapsedS)} ${isQueued ? 'in the queue' : 'so far'}`}
        </p>
        <Button variant="secondary" onClick={() => cancel.mutate()} disabled={cancel.isPending}>
          {cancel.isPending ? 'Cancelling ...' : 'Cancel this run'}
        </Button>
      </div>
      {cancel.isError && <Notice kind="danger">{sayProblem(cancel.error)}</Notice>}
      {isOutOfTouch && (
        <Notice kind="caution">
          The server does not answer at the moment. The run itself goes on; this page keeps asking.
        </Notice>
      )}
      <p className="text-muted text-sm">
        You can close this page: the run goes on and waits for you in the list of runs.
      </p>
    </section>
  );
}

/** Null until the page is alive, so that server and screen agree. */
function useSecondsSince(iso: string): number | null {
  const [nowMs, setNowMs] = useState<number | null>(null);
  useEffect(() => {
    const tick = () => setNowMs(Date.now());
    const timer = setInterval(tick, 1000);
    return () => clearInterval(timer);
  }, []);
  return nowMs === null ? null : (nowMs - Date.parse(iso)) / 1000;
}
