import type { EntityManager } from '@mikro-orm/postgresql';
import type { Run } from '@/entities';
import type { RunSummary } from '@/entities/run-summary';
import type { Actor } from '@/src/access/actor';
import { Refusal } from '@/src/errors';
import { ownRun, type RunRow } from './find-runs';

export type FinishedRun = Run & { summary: RunSummary };

/** A run that has an answer; one that has none yet is refused with its state. */
export async function finishedRun(
  em: EntityManager,
  actor: Actor,
  id: string,
): Promise<RunRow & { summary: RunSummary }> {
  const run = await ownRun(em, actor, id);
  if (!run.summary) throw new Refusal('conflict', `This run has no results: it is ${run.status}.`);
  return run as RunRow & { summary: RunSummary };
}
