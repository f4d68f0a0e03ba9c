import { betaOf } from '@/src/physics/beta';
import { lorentzRatio } from '@/src/physics/charge';
import { discCollisionTimeYr } from '@/src/physics/collisions';
import { prTimeYr } from '@/src/physics/drag';
import { isUnbound, regimeOf } from '@/src/physics/fate';
import { orbitAfterRelease, semiMajorAxisFromDistance, trueAnomalyDegOf } from '@/src/physics/orbit';
import type { GrainChunk } from './grain-chunk';
import { emptyResults, type GrainResults } from './grain-results';
import type { PreparedRun } from './prepare-run';
import { regimes } from './schema';

/** Everything that a run says of each grain. Pure: the same inputs give the same bits. */
export function computeGrains({ inputs, wind, materials }: PreparedRun, chunk: GrainChunk): GrainResults {
  const { star, release, disc, charging, betaCritical } = inputs;
  const { massSun, luminositySun } = star;
  const { distanceAu, eccentricity, parentBeta } = release;
  const trueAnomalyDeg = trueAnomalyDegOf(release);
  const semiMajorAxisAu = semiMajorAxisFromDistance(distanceAu, eccentricity, trueAnomalyDeg);
  const released = { semiMajorAxisAu, eccentricity, trueAnomalyDeg, parentBeta, massSun };
  const collisionTimeYr = disc ? discCollisionTimeYr({ distanceAu, massSun, opticalDepth: disc.opticalDepth }) : NaN;
  const results = emptyResults(chunk.length);
  for (let row = 0; row < chunk.length; row += 1) {
    const material = materials.get(chunk.material[row]);
    if (!material) throw new Error(`the material ${chunk.material[row]} was not prepared`);
    const radiusM = chunk.radiusM[row];
    const densityKgM3 = chunk.densityKgM3[row];
    const optics = material.at(densityKgM3);
    const qpr = optics.efficiencies.qpr(radiusM);
    const light = { radiusM, densityKgM3, massSun, luminositySun };
    const beta = betaOf({ ...light, qpr: qpr + wind.addedQpr });
    const unbound = isUnbound(beta, betaCritical);
    const orbit = orbitAfterRelease({ ...released, beta });
    const bound = !unbound && orbit.semiMajorAxisAu !== null && orbit.eccentricity !== null;
    const dragYr = bound
      ? prTimeYr({
          semiMajorAxisAu: orbit.semiMajorAxisAu!,
          eccentricity: orbit.eccentricity!,
          beta: betaOf({ ...light, qpr }),
          massSun,
        }) /
        (1 + wind.dragRatioTimesQpr / qpr)
      : NaN;
    results.qpr[row] = qpr;
    results.beta[row] = beta;
    results.isUnbound[row] = unbound ? 1 : 0;
    results.pUnbound[row] = probabilityOf(optics.probability, chunk, row, unbound);
    results.prTimeYr[row] = dragYr;
    results.collisionTimeYr[row] = collisionTimeYr;
    results.semiMajorAxisAu[row] = orbit.semiMajorAxisAu ?? NaN;
    results.eccentricity[row] = orbit.eccentricity ?? NaN;
    results.vInfKmS[row] = orbit.vInfKmS ?? NaN;
    results.temperatureK[row] = optics.efficiencies.temperatureK(radiusM);
    if (charging) results.lorentzRatio[row] = lorentzRatio({ ...charging, radiusM, densityKgM3, distanceAu, massSun });
    results.regime[row] = regimes.indexOf(
      regimeOf({
        isUnbound: unbound,
        dragTimeYr: bound ? dragYr : null,
        collisionTimeYr: disc ? collisionTimeYr : null,
      }),
    );
  }
  return results;
}

type Probability = (radiusM: number, sigmaM: number, densityKgM3: number, densitySigmaKgM3: number) => number;

/** Without errors the fate itself is certain. */
function probabilityOf(probability: Probability, chunk: GrainChunk, row: number, unbound: boolean): number {
  const radiusSigmaM = chunk.radiusSigmaM[row] || 0;
  const densitySigmaKgM3 = chunk.densitySigmaKgM3[row] || 0;
  if (radiusSigmaM === 0 && densitySigmaKgM3 === 0) return unbound ? 1 : 0;
  const share = probability(chunk.radiusM[row], radiusSigmaM, chunk.densityKgM3[row], densitySigmaKgM3);
  return Math.min(1, Math.max(0, share));
}
