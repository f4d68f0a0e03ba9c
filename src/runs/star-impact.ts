import type { EntityManager } from '@mikro-orm/postgresql';
import { Run } from '@/entities';
import type { FrozenStar, RunInputs } from '@/entities/run-inputs';
import type { Actor } from '@/src/access/actor';
import { demand, ofOwnGroup } from '@/src/access/policy';
import { breathe } from '@/src/claim';
import { betaOf } from '@/src/physics/beta';
import { isUnbound } from '@/src/physics/fate';
import { visibleVersion } from '@/src/stars/manageable-star';
import { grainChunks } from './grain-chunk';
import { materialSummary } from './material-summary';
import { prepareRun, type PreparedRun } from './prepare-run';
import type { ImpactItem } from './impact-schema';

const mostRuns = 20;
const mostGrains = 200_000;

/**
 * What a version of a star would change in the newest finished runs that used another one: radii and removed share then
 * and now. Nothing of a run changes. Administrators see runs of all groups, others those of their own.
 */
export async function starImpact(em: EntityManager, actor: Actor, versionId: string): Promise<ImpactItem[]> {
  demand(actor, 'run.impact');
  const version = await visibleVersion(em, actor, versionId);
  const { slug } = version.star;
  const seen = actor.platformRole === 'admin' ? {} : ofOwnGroup(actor);
  const runs = await em.find(
    Run,
    {
      ...seen,
      status: 'done',
      inputs: { star: { slug } } as object,
      catalogue: { rowsAccepted: { $lte: mostGrains } },
    },
    { populate: ['group'], orderBy: { createdAt: 'desc', id: 'desc' }, limit: mostRuns },
  );
  const { massSun, luminositySun, teffK, name, spectrum, citation, radiusSun } = version;
  const star: FrozenStar = {
    slug,
    version: version.version,
    name,
    massSun,
    luminositySun,
    teffK,
    radiusSun: radiusSun ?? null,
    spectrum: spectrum ?? null,
    citation,
  };
  const items: ImpactItem[] = [];
  for (const run of runs) items.push(await impactOn(em, run, star));
  return items;
}

async function impactOn(em: EntityManager, run: Run, star: FrozenStar): Promise<ImpactItem> {
  const inputs: RunInputs = { ...run.inputs, star };
  const prepared = await prepareRun(em, run.catalogue.id, inputs, new AbortController().signal, () => undefined);
  const shareAfter = await unboundShare(em, run.catalogue.id, prepared);
  const before = run.summary?.perMaterial ?? [];
  const after = [...prepared.materials.values()].map((material) => materialSummary(prepared, material, 0));
  return {
    run: run.name,
    group: run.group.name ?? '',
    usedVersion: run.inputs.star.version ?? 0,
    shareBefore: run.summary?.unbound.numberShare ?? 0,
    shareAfter,
    materials: after.map(({ material, name, unboundIntervalsUm }) => ({
      material: name,
      before: before.find((one) => one.material === material)?.unboundIntervalsUm ?? [],
      after: unboundIntervalsUm,
    })),
  };
}

async function unboundShare(
  em: EntityManager,
  catalogueId: string,
  { inputs, materials }: PreparedRun,
): Promise<number> {
  const { massSun, luminositySun } = inputs.star;
  let total = 0;
  let unbound = 0;
  for await (const chunk of grainChunks(em, catalogueId)) {
    for (let row = 0; row < chunk.length; row += 1) {
      const radiusM = chunk.radiusM[row];
      const densityKgM3 = chunk.densityKgM3[row];
      const qpr = materials.get(chunk.material[row])?.at(densityKgM3).effectiveQpr(radiusM) ?? NaN;
      total += chunk.count[row];
      if (isUnbound(betaOf({ qpr, radiusM, densityKgM3, massSun, luminositySun }), inputs.betaCritical))
        unbound += chunk.count[row];
    }
    await breathe();
  }
  return total > 0 ? unbound / total : 0;
}
