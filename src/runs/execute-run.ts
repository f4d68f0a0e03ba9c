import type { EntityManager } from '@mikro-orm/postgresql';
import { Run } from '@/entities';
import { breathe, ClaimLost, whileBeating } from '@/src/claim';
import { beatRun, claimRun, type RunProgress } from './claim-run';
import { computeGrains } from './compute-grains';
import { grainChunks, type GrainChunk } from './grain-chunk';
import type { GrainResults } from './grain-results';
import { prepareRun, type PreparedRun } from './prepare-run';
import { sizeSpread } from './size-spread';
import { storeResults } from './store-results';
import { RunTally } from './run-tally';

const mostAttempts = 3;
const shareOfCurves = 0.5;

/** The job: claims the run, computes it and stores it whole, once. */
export async function executeRun(em: EntityManager, id: string): Promise<void> {
  const held = await claimRun(em, id);
  if (!held) return;
  const shown: RunProgress = { progress: 0, stage: 'Reading the inputs' };
  try {
    await whileBeating(
      () => beatRun(em.fork(), id, held.claim, shown),
      (signal) => computeAndStore(em.fork(), id, held.claim, shown, signal),
    );
  } catch (error) {
    if (error instanceof ClaimLost) return;
    await giveUp(em.fork(), id, held);
    throw error;
  }
}

async function computeAndStore(
  em: EntityManager,
  id: string,
  claim: string,
  shown: RunProgress,
  signal: AbortSignal,
): Promise<void> {
  const { inputs, catalogue } = await em.findOneOrFail(Run, { id, claim });
  const prepared = await prepareRun(em, catalogue.id, inputs, signal, (share, stage) => {
    Object.assign(shown, { progress: shareOfCurves * share, stage });
  });
  const tally = new RunTally(prepared, await sizeSpread(em, catalogue.id));
  await em.transactional(async (tx) => {
    const resultSha256 = await storeResults(tx, id, computed(em, catalogue.id, prepared, tally, shown, signal));
    const { summary, histograms } = tally.finish();
    const changed = await tx.nativeUpdate(
      Run,
      { id, claim, status: 'running' },
      {
        status: 'done',
        progress: 1,
        stage: 'Done',
        summary,
        histograms,
        resultSha256,
        claim: null,
        finishedAt: new Date(),
      },
    );
    if (changed === 0) throw new ClaimLost();
  });
}

async function* computed(
  em: EntityManager,
  catalogueId: string,
  prepared: PreparedRun,
  tally: RunTally,
  shown: RunProgress,
  signal: AbortSignal,
): AsyncGenerator<{ chunk: GrainChunk; results: GrainResults }> {
  let rows = 0;
  for await (const chunk of grainChunks(em, catalogueId)) {
    const results = computeGrains(prepared, chunk);
    tally.add(chunk, results);
    yield { chunk, results };
    rows += chunk.length;
    const share = rows / Math.max(1, prepared.inputs.catalogue.rows);
    Object.assign(shown, { progress: shareOfCurves + (1 - shareOfCurves) * share, stage: 'Computing the grains' });
    await breathe();
    signal.throwIfAborted();
  }
}

/** A surprise may pass (the database restarts): tried again by the sweeper, but not for ever. */
async function giveUp(
  em: EntityManager,
  id: string,
  { claim, attempts }: { claim: string; attempts: number },
): Promise<void> {
  const mine = { id, claim, status: 'running' } as const;
  if (attempts < mostAttempts) {
    await em.nativeUpdate(Run, mine, {
      status: 'queued',
      claim: null,
      stage: 'Waiting to be tried again',
      heartbeatAt: new Date(),
    });
    return;
  }
  const error =
    'The computation ended unexpectedly on our side, several times. Tell the administrator; the inputs are kept.';
  await em.nativeUpdate(Run, mine, { status: 'failed', claim: null, stage: 'Failed', error, finishedAt: new Date() });
}
