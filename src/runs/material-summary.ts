import type { MaterialSummary } from '@/entities/run-summary';
import type { PreparedMaterial, PreparedRun } from './prepare-run';
import { unboundAnswer } from './unbound-answer';

/** What a run says of one material, for grains of its mean density. */
export function materialSummary(
  { inputs }: PreparedRun,
  material: PreparedMaterial,
  unboundNumberShare: number,
): MaterialSummary {
  const { frozen, population, nodes } = material;
  const densityKgM3 = population.meanDensityKgM3;
  const { massSun, luminositySun } = inputs.star;
  const isConstant = inputs.optics.model === 'constant';
  const { effectiveQpr } = material.at(densityKgM3);
  return {
    material: frozen.slug,
    name: frozen.name,
    grains: population.rows,
    meanDensityGCm3: densityKgM3 / 1000,
    ...unboundAnswer(effectiveQpr, isConstant, { densityKgM3, massSun, luminositySun }, inputs.betaCritical),
    curveKey: nodes.length === 1 ? nodes[0].key : null,
    relativeErrorBound: Math.max(0, ...nodes.map(({ curve }) => curve.relativeErrorBound)),
    shareOutsideValidRange: Math.max(0, ...nodes.map(({ curve }) => curve.shareOutsideValidRange)),
    unboundNumberShare,
  };
}
