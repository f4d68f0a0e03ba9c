'use client';

import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import type { RunItem } from '@/src/runs/schema';
import { apiGet, worthAskingAgain } from './run-api';
import { RunAnswer } from './run-answer-view';
import { RunCancelled, RunFailed } from './run-ended';
import { RunResults } from './run-results';
import { RunWaiting } from './run-waiting';

const askEveryMs = 1000;

export const isUnderWay = ({ status }: Pick<RunItem, 'status'>) => status === 'queued' || status === 'running';

/** A run as it is now: asks each second while it is under way, then shows the answer, and what belongs below it, without a reload. */
export function RunLive({ initial, children }: { initial: RunItem; children?: ReactNode }) {
  const { data: run, isError } = useQuery({
    queryKey: ['run', initial.id],
    queryFn: ({ signal }) => apiGet<RunItem>(`/api/v1/runs/${initial.id}`, signal),
    initialData: initial,
    refetchInterval: ({ state }) => (state.data && isUnderWay(state.data) ? askEveryMs : false),
    refetchIntervalInBackground: true,
    refetchOnMount: false,
    retry: worthAskingAgain,
  });
  return (
    <>
      <p role="status" className="sr-only">
        {announcement(run)}
      </p>
      {isUnderWay(run) && <RunWaiting run={run} isOutOfTouch={isError} />}
      {run.status === 'failed' && <RunFailed run={run} />}
      {run.status === 'cancelled' && <RunCancelled run={run} />}
      {run.status === 'done' && run.summary && (
        <>
          <RunAnswer run={run} summary={run.summary} />
          <RunResults run={run} summary={run.summary} />
          <div className="mt-10">{children}</div>
        </>
      )}
    </>
  );
}

function announcement({ status, stage, error }: RunItem): string {
  if (status === 'done') return 'The run is done.';
  if (status === 'failed') return `The run failed. ${error ?? ''}`;
  if (status === 'cancelled') return 'The run was cancelled.';
  return stage || 'The run is waiting for a free worker.';
}
