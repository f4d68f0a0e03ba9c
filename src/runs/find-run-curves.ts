import type { EntityManager } from '@mikro-orm/postgresql';
import type { RunInputs } from '@/entities/run-inputs';
import type { MaterialSummary } from '@/entities/run-summary';
import type { Actor } from '@/src/access/actor';
import { betaOf } from '@/src/physics/beta';
import { qprAt } from '@/src/physics/curve';
import { windFactors } from '@/src/physics/drag';
import { recipeOf, spectrumOf } from './curve-ingredients';
import { finishedRun, type FinishedRun } from './finished-run';
import { porosityOf } from './porosity-nodes';
import { radiusSamplesUm } from './radius-samples';
import { recentCurve } from './recent-curves';
import type { RunCurves } from './schema';

/** The curves that the run used, for grains of each material's mean density. */
export async function findRunCurves(em: EntityManager, actor: Actor, id: string): Promise<RunCurves> {
  return curvesOfRun(em, await finishedRun(em, actor, id));
}

export async function curvesOfRun(em: EntityManager, { inputs, summary }: FinishedRun): Promise<RunCurves> {
  const curves = await Promise.all(summary.perMaterial.map((material) => drawn(em, inputs, material)));
  return { betaCritical: summary.betaCritical, curves };
}

async function drawn(em: EntityManager, inputs: RunInputs, { material, name, meanDensityGCm3 }: MaterialSummary) {
  const { massSun, luminositySun } = inputs.star;
  const qprOf = await qprFunction(em, inputs, material, meanDensityGCm3);
  const added = inputs.wind ? windFactors({ ...inputs.wind, qpr: 1, luminositySun }).pressureRatio : 0;
  const qpr = radiusSamplesUm.map((radiusUm) => qprOf(radiusUm * 1e-6));
  const grain = { densityKgM3: meanDensityGCm3 * 1000, massSun, luminositySun };
  const beta = radiusSamplesUm.map((radiusUm, index) =>
    betaOf({ ...grain, radiusM: radiusUm * 1e-6, qpr: qpr[index] + added }),
  );
  return { material, name, densityGCm3: meanDensityGCm3, radiiUm: [...radiusSamplesUm], qpr, beta };
}

async function qprFunction(
  em: EntityManager,
  inputs: RunInputs,
  slug: string,
  meanDensityGCm3: number,
): Promise<(radiusM: number) => number> {
  const { optics, materials, star } = inputs;
  if (optics.model === 'constant') return () => optics.qpr ?? 1;
  const frozen = materials.find((material) => material.slug === slug);
  if (!frozen) throw new Error(`the material ${slug} is not among the run's inputs`);
  const porosity =
    optics.porosity === 'fromDensity' ? porosityOf(meanDensityGCm3 * 1000, frozen.densityKgM3) : (optics.porosity ?? 0);
  const curve = await recentCurve(em, {
    recipe: recipeOf(frozen, optics, materials, porosity),
    spectrum: spectrumOf(star),
  });
  return (radiusM) => qprAt(curve, radiusM);
}
