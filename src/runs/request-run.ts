import type { EntityManager } from '@mikro-orm/postgresql';
import { Catalogue, Run } from '@/entities';
import type { RunInputs } from '@/entities/run-inputs';
import type { Actor } from '@/src/access/actor';
import { demand, ofOwnGroup } from '@/src/access/policy';
import { recordChange } from '@/src/audit/record-change';
import { Refusal } from '@/src/errors';
import { ENGINE_VERSION } from '@/src/physics/engine-version';
import { enqueue, queues } from '@/src/queue';
import { freezeInputs } from './freeze-inputs';
import type { RunRequest } from './request-schema';

/** Freezes every input by value and asks for the computation, both in one transaction. */
export async function requestRun(
  em: EntityManager,
  actor: Actor,
  request: RunRequest,
): Promise<{ id: string; status: Run['status'] }> {
  demand(actor, 'run.request');
  return em.transactional(async (tx) => {
    const catalogue = await readyCatalogue(tx, actor, request.catalogueId);
    const inputs = await freezeInputs(tx, actor.groupId, catalogue, request);
    const run = tx.create(Run, {
      group: actor.groupId!,
      requestedBy: actor.personId,
      catalogue,
      name: request.name ?? defaultName(inputs),
      status: 'queued',
      stage: 'Waiting for a worker',
      inputs,
      engineVersion: ENGINE_VERSION,
    });
    await tx.flush();
    recordChange(tx, actor, {
      action: 'run.request',
      target: { kind: 'run', id: run.id, name: run.name },
      groupId: actor.groupId,
      after: { catalogue: catalogue.name, star: inputs.star.name },
    });
    await enqueue(tx, queues.executeRun, run.id);
    return { id: run.id, status: run.status };
  });
}

async function readyCatalogue(em: EntityManager, actor: Actor, id: string): Promise<Catalogue> {
  const pointer = '/catalogueId';
  const catalogue = await em.findOne(Catalogue, { id, ...ofOwnGroup(actor) });
  if (!catalogue)
    throw new Refusal('notFound', 'There is no such catalogue.', [
      { pointer, detail: 'is not a catalogue of your group' },
    ]);
  if (catalogue.status === 'ready') return catalogue;
  const detail = catalogue.status === 'checking' ? 'is still being checked' : 'could not be read';
  throw new Refusal('conflict', `The catalogue "${catalogue.name}" ${detail}.`, [{ pointer, detail }]);
}

const defaultName = ({ catalogue, star }: RunInputs) => `${catalogue.name}, ${star.name}`.slice(0, 200);
