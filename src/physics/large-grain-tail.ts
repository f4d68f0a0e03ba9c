import type { Clarity } from './clarity';
import type { GrainSampler } from './grain-sampler';
import { leastSquares } from './least-squares';
import { CURVE_INTERVALS, radiusOfIndex, type CurveNode } from './radius-grid';
import { rayMean, raysOf } from './ray-mean';
import { sparseMeans } from './sparse-means';
import type { SpectralGrid } from './spectral-grid';

const TAIL_STEP = 16;
/** The fit uses the Mie means of the last factor 6 in radius before the tail. */
const FIT_FACTOR = 6;
/** Mie means inside the tail of opaque grains, at 3 and 12 times its start: metals approach their limit slowly. */
const ANCHOR_INDICES = [44, 100];
/** Mie and ray optics are compared on the same wavelengths, so that few will do. */
const ANCHOR_LEVEL = 1;
const RESIDUAL_MARGIN = 3;
/** Powers of 1/s; more would only follow the noise of transparent materials' means. */
const POWERS = [1, 4 / 3, 5 / 3];
const ANCHORED_POWERS = [2 / 3, 1, 4 / 3, 5 / 3];

/**
 * Means beyond the Mie range: Q_pr = Q_GO(s) + sum of c_i s^-p_i and Q_abs = Q_GO,abs(s) (1 + the same sum with its own
 * constants), Q_GO being the spectral mean of ray optics. The constants are least-squares fits to the Mie means just below, and for
 * opaque grains to two sparse ones above; bare ray optics is 1 % off at 100 um. Against full Mie up to 1 mm, 2500 to 20 000 K: all
 * absorbing library materials within 9e-5, transparent ones within the noise of their means (6e-4). The error returned is three
 * times the largest residual.
 */
export function largeGrainTail(
  sampler: GrainSampler,
  grid: SpectralGrid,
  clarity: Clarity,
  mieNodes: CurveNode[],
  tailIndex: number,
): { nodes: CurveNode[]; relativeError: number } {
  const rays = raysOf(sampler, grid, clarity.rayLevel);
  const tailStartM = radiusOfIndex(tailIndex);
  const isAnchored = clarity.kind === 'opaque';
  const powers = isAnchored ? ANCHORED_POWERS : POWERS;
  const terms = (index: number) => powers.map((power) => (radiusOfIndex(index) / tailStartM) ** -power);
  const below = mieNodes.filter((node) => radiusOfIndex(node.index) >= tailStartM / FIT_FACTOR);
  const fitted = [
    ...below.map((node) => ({ node, limit: rayMean(rays, radiusOfIndex(node.index)) })),
    ...(isAnchored ? anchors(sampler, grid, tailIndex) : []),
  ];
  const rows = fitted.map(({ node }) => terms(node.index));
  const pressure = leastSquares(
    rows,
    fitted.map(({ node, limit }) => node.qPr - limit.qPr),
  );
  const absorption = leastSquares(
    rows,
    fitted.map(({ node, limit }) => (limit.qAbs > 0 ? node.qAbs / limit.qAbs - 1 : 0)),
  );
  const nodes: CurveNode[] = [];
  for (let index = tailIndex + TAIL_STEP; index <= CURVE_INTERVALS; index += TAIL_STEP) {
    const limit = rayMean(rays, radiusOfIndex(index));
    nodes.push({
      index,
      qPr: limit.qPr + dot(pressure, terms(index)),
      qAbs: limit.qAbs * (1 + dot(absorption, terms(index))),
    });
  }
  const relativeError = fitted.reduce((worst, { node, limit }, row) => {
    const residual = node.qPr - limit.qPr - dot(pressure, rows[row]);
    return Math.max(worst, Math.abs(residual) / node.qPr);
  }, 0);
  return { nodes, relativeError: RESIDUAL_MARGIN * relativeError };
}

function anchors(sampler: GrainSampler, grid: SpectralGrid, tailIndex: number) {
  const means = sparseMeans(sampler, grid, ANCHOR_LEVEL);
  return ANCHOR_INDICES.map((offset) => {
    const index = tailIndex + offset;
    const { mie, ray } = means(radiusOfIndex(index));
    return { node: { index, ...mie }, limit: ray };
  });
}

function dot(a: number[], b: number[]): number {
  return a.reduce((sum, value, index) => sum + value * b[index], 0);
}
