import type { EntityManager } from '@mikro-orm/postgresql';
import type { Actor } from '@/src/access/actor';
import { finishedRun } from './finished-run';
import type { histogramBy, RunHistogram } from './schema';

const units = { number: 'grains', area: 'µm²', mass: 'kg' } as const;

export async function findRunHistogram(
  em: EntityManager,
  actor: Actor,
  id: string,
  by: (typeof histogramBy)[number],
): Promise<RunHistogram> {
  const run = await finishedRun(em, actor, id);
  if (!run.histograms) throw new Error(`run ${run.id} is done but has no histograms`);
  return { by, unit: units[by], edgesUm: run.histograms.edgesUm, ...run.histograms[by] };
}
