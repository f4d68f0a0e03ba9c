import type { EntityManager } from '@mikro-orm/postgresql';
import type { Actor } from '@/src/access/actor';
import { finishedRun, type FinishedRun } from './finished-run';
import type { histogramBy, RunHistogram } from './schema';

type HistogramBy = (typeof histogramBy)[number];

const units = { number: 'grains', area: 'µm²', mass: 'kg' } as const;

export async function findRunHistogram(
  em: EntityManager,
  actor: Actor,
  id: string,
  by: HistogramBy,
): Promise<RunHistogram> {
  return histogramOfRun(await finishedRun(em, actor, id), by);
}

export function histogramOfRun(run: FinishedRun, by: HistogramBy): RunHistogram {
  if (!run.histograms) throw new Error(`run ${run.id} is done but has no histograms`);
  return { by, unit: units[by], edgesUm: run.histograms.edgesUm, ...run.histograms[by] };
}
