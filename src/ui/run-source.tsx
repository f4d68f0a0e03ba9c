'use client';

import { createContext, useContext, type ReactNode } from 'react';

/** Where the parts of a run page get their data, and whether the page is a shared one, seen from outside the group. */
export type RunSource = { base: string; isShared: boolean; mayDownload: boolean };

const Source = createContext<RunSource | null>(null);

export function RunSourceProvider({ source, children }: { source: RunSource; children: ReactNode }) {
  return <Source.Provider value={source}>{children}</Source.Provider>;
}

export function useRunSource(runId: string): RunSource {
  return useContext(Source) ?? { base: `/api/v1/runs/${runId}`, isShared: false, mayDownload: true };
}
