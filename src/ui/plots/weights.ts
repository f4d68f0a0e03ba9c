import type { RunHistogram } from '@/src/runs/schema';

/** What a grain counts for in the size distribution. */
export type Weight = RunHistogram['by'];

export const weights = ['number', 'area', 'mass'] as const satisfies readonly Weight[];

export const weightWords: Readonly<Record<Weight, string>> = { number: 'number', area: 'cross-section', mass: 'mass' };
