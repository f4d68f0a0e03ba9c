'use client';

import type { RunItem } from '@/src/runs/schema';
import { RunAnswer } from './run-answer-view';
import { RunResults } from './run-results';
import { RunSourceProvider } from './run-source';

/** The run page, read-only, for somebody who has the link. */
export function SharedRun({ run, base, mayDownload }: { run: RunItem; base: string; mayDownload: boolean }) {
  if (!run.summary) return null;
  return (
    <RunSourceProvider source={{ base, isShared: true, mayDownload }}>
      <RunAnswer run={run} summary={run.summary} />
      <RunResults run={run} summary={run.summary} />
    </RunSourceProvider>
  );
}
