import type { Clarity } from './clarity';
import type { GrainSampler } from './grain-sampler';
import { CURVE_INTERVALS, LN_RADIUS_STEP, radiusOfIndex, type CurveNode } from './radius-grid';
import { rayMean, raysOf } from './ray-mean';
import { sparseMeans } from './sparse-means';
import type { SpectralGrid } from './spectral-grid';

const SPARSE_LEVEL = { opaque: 1, hazy: 1, clear: 2 };
/** Grid steps between the nodes, a factor of 2 in radius. */
const STEP = 28;
/** Mie is followed over so many of them, to 16 times the start of the tail. */
const MIE_STEPS = 4;
const DECAY = Math.exp(-STEP * LN_RADIUS_STEP);

/** What the core adds to the ray optics of the surface: pairs of Q_pr and Q_abs. */
type Added = [number, number];

/**
 * Means of large coated grains: spectral mean of the surface's ray optics plus what the core adds, which is the difference
 * of coated Mie and ray optics on a few wavelengths. Beyond 16 times the start of the tail that difference goes on as
 * a limit and a part that falls as 1/s. The error returned is how far the last difference was from what the two before it foretold.
 */
export function coatedTail(
  sampler: GrainSampler,
  grid: SpectralGrid,
  clarity: Clarity,
  tailIndex: number,
): { nodes: CurveNode[]; relativeError: number } {
  const rays = raysOf(sampler, grid, clarity.rayLevel);
  const means = sparseMeans(sampler, grid, SPARSE_LEVEL[clarity.kind]);
  const nodes: CurveNode[] = [];
  const added: Added[] = [];
  let relativeError = 0;
  for (let index = tailIndex + STEP; index < CURVE_INTERVALS + STEP; index += STEP) {
    const radiusM = radiusOfIndex(Math.min(index, CURVE_INTERVALS));
    const surface = rayMean(rays, radiusM);
    if (added.length < MIE_STEPS) {
      const { mie, ray } = means(radiusM);
      added.push([mie.qPr - ray.qPr, mie.qAbs - ray.qAbs]);
      if (added.length === MIE_STEPS)
        relativeError = Math.abs(added[MIE_STEPS - 1][0] - foretold(added.slice(0, -1))[0]) / mie.qPr;
    } else added.push(foretold(added));
    const [pressure, absorption] = added[added.length - 1];
    nodes.push({
      index: Math.min(index, CURVE_INTERVALS),
      qPr: surface.qPr + pressure,
      qAbs: surface.qAbs + absorption,
    });
  }
  return { nodes, relativeError };
}

/** One step further: what falls as 1/s changes by `DECAY` times the last change. */
function foretold(added: Added[]): Added {
  const [before, last] = added.slice(-2);
  return [last[0] + DECAY * (last[0] - before[0]), last[1] + DECAY * (last[1] - before[1])];
}
