import type { EntityManager } from '@mikro-orm/postgresql';
import type { FrozenMaterial, RunOptics } from '@/entities/run-inputs';
import type { Actor } from '@/src/access/actor';
import { demand } from '@/src/access/policy';
import { resolveMaterial } from '@/src/materials/resolve-material';
import { betaOf } from '@/src/physics/beta';
import { qprAt } from '@/src/physics/curve';
import { meanDensityOfCoated } from '@/src/physics/mantle';
import { resolveStar } from '@/src/stars/resolve-star';
import { recipeOf, spectrumOf } from './curve-ingredients';
import { porosityOf } from './porosity-nodes';
import { radiusSamplesUm } from './radius-samples';
import { recentCurve } from './recent-curves';
import type { CurveRequest } from './request-schema';
import type { CurveAnswer } from './schema';
import { unboundAnswer } from './unbound-answer';

const circularRelease = 0.5;

/** The calculator: one material, one star; computed beside the event loop, nothing stored. */
export async function computeCurve(em: EntityManager, actor: Actor, request: CurveRequest): Promise<CurveAnswer> {
  demand(actor, 'curve.compute');
  const star = await resolveStar(em, actor.groupId, request);
  const core = await resolveMaterial(em, actor.groupId, request, '/slug');
  const optics: RunOptics = request.optics ?? { model: 'mie' };
  const mantle =
    optics.mantle &&
    (await resolveMaterial(em, actor.groupId, { slug: optics.mantle.material }, '/optics/mantle/material'));
  const densityKgM3 =
    request.densityGCm3 === undefined ? ownDensityKgM3(core, optics, mantle) : request.densityGCm3 * 1000;
  const efficiency = await efficiencyOf();
  const betaCritical = request.betaCritical ?? circularRelease;
  const grain = { densityKgM3, massSun: star.massSun, luminositySun: star.luminositySun };
  const radiiUm = request.radiiUm ?? [...radiusSamplesUm];
  const qpr = radiiUm.map((radiusUm) => efficiency.qpr(radiusUm * 1e-6));
  return {
    radiiUm,
    qpr,
    beta: radiiUm.map((radiusUm, index) => betaOf({ ...grain, radiusM: radiusUm * 1e-6, qpr: qpr[index] })),
    relativeErrorBound: efficiency.relativeErrorBound,
    shareOutsideValidRange: efficiency.shareOutsideValidRange,
    betaCritical,
    ...unboundAnswer(efficiency.qpr, optics.model === 'constant', grain, betaCritical),
    densityGCm3: densityKgM3 / 1000,
    notes: efficiency.notes,
  };

  async function efficiencyOf() {
    if (optics.model === 'constant') {
      return { qpr: () => optics.qpr ?? 1, relativeErrorBound: 0, shareOutsideValidRange: 0, notes: [] };
    }
    const frozenOptics =
      mantle && optics.mantle ? { ...optics, mantle: { ...optics.mantle, material: mantle.slug } } : optics;
    const porosity =
      optics.porosity === 'fromDensity' ? porosityOf(densityKgM3, core.densityKgM3) : (optics.porosity ?? 0);
    const recipe = recipeOf(core, frozenOptics, mantle ? [mantle] : [], porosity);
    const curve = await recentCurve(em, { recipe, spectrum: spectrumOf(star) });
    const { relativeErrorBound, shareOutsideValidRange, notes } = curve;
    return { qpr: (radiusM: number) => qprAt(curve, radiusM), relativeErrorBound, shareOutsideValidRange, notes };
  }
}

/** Of a grain as described: voids and mantle counted in. */
function ownDensityKgM3(
  core: FrozenMaterial,
  { porosity, mantle: coat }: RunOptics,
  mantle: FrozenMaterial | undefined,
): number {
  if (mantle && coat)
    return meanDensityOfCoated({
      coreKgM3: core.densityKgM3,
      mantleKgM3: mantle.densityKgM3,
      mantleVolumeFraction: coat.volumeFraction,
    });
  return core.densityKgM3 * (1 - (typeof porosity === 'number' ? porosity : 0));
}
