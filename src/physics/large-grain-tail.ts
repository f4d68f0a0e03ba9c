import type { Clarity } from './clarity';
import type { GrainSampler } from './grain-sampler';
import { leastSquares } from './least-squares';
import { CURVE_INTERVALS, radiusOfIndex, type CurveNode } from './radius-grid';
import { rayOptics, type RayOptics } from './ray-optics';
import type { SpectralGrid } from './spectral-grid';

const TAIL_STEP = 16;
/** The fit uses the Mie means of the last factor 6 in radius before the tail. */
const FIT_FACTOR = 6;
/** Mie means inside the tail of opaque grains, for metals approach their limit slowly: at 3 and 12 times its start. */
const ANCHOR_INDICES = [44, 100];
/** Mie and ray optics are compared on the same wavelengths, so that few will do. */
const ANCHOR_LEVEL = 1;
const RESIDUAL_MARGIN = 3;
/** Powers of 1/s; more would only follow the noise of transparent materials' means. */
const POWERS = [1, 4 / 3, 5 / 3];
const ANCHORED_POWERS = [2 / 3, 1, 4 / 3, 5 / 3];
/** Through a mantle the core shines: the surface's ray optics then misses the limit by a constant. */
const COATED_POWERS = [0, 1, 4 / 3];

interface Means {
  qPr: number;
  qAbs: number;
}

interface Ray {
  weight: number;
  wavelengthM: number;
  optics: RayOptics;
}

/**
 * Means beyond the Mie range: Q_pr = Q_GO(s) + c1/s + c2/s^(4/3) + c3/s^(5/3) and Q_abs = Q_GO,abs(s) (1 + the same powers), Q_GO
 * being the spectral mean of ray optics. The constants are least-squares fits to the Mie means just below; bare ray
 * optics is 1 % off at 100 um. Tried against full Mie at 0.2, 0.5 and 1 mm: with s^(-2/3) instead iron errs by 9e-4, without s^(-5/3) by
 * 5e-4, with these three by 4e-5 (troilite, the worst of the library, 2e-4). The error returned is three times the largest residual.
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
  const isAnchored = clarity.kind === 'opaque' && !sampler.isCoated;
  const powers = sampler.isCoated ? COATED_POWERS : isAnchored ? ANCHORED_POWERS : POWERS;
  const terms = (index: number) => powers.map((power) => (radiusOfIndex(index) / tailStartM) ** -power);
  const below = mieNodes.filter((node) => radiusOfIndex(node.index) >= tailStartM / FIT_FACTOR);
  const fitted = [
    ...below.map((node) => ({ node, limit: rayMean(rays, radiusOfIndex(node.index)) })),
    ...(isAnchored ? anchorsOf(sampler, grid, tailIndex) : []),
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

/** Mie means of radii inside the tail beside the ray-optics means that the same few wavelengths give. */
function anchorsOf(sampler: GrainSampler, grid: SpectralGrid, tailIndex: number): { node: CurveNode; limit: Means }[] {
  const rays = raysOf(sampler, grid, ANCHOR_LEVEL);
  const weights = grid.weights[ANCHOR_LEVEL];
  const stride = (grid.wavelengthM.length - 1) / (weights.length - 1);
  const pair = new Float64Array(2);
  return ANCHOR_INDICES.map((offset) => {
    const node = { index: tailIndex + offset, qPr: 0, qAbs: 0 };
    weights.forEach((weight, position) => {
      sampler.sample(pair, radiusOfIndex(node.index), position * stride);
      node.qPr += weight * pair[0];
      node.qAbs += weight * pair[1];
    });
    return { node, limit: rayMean(rays, radiusOfIndex(node.index)) };
  });
}

function raysOf(sampler: GrainSampler, grid: SpectralGrid, level: number): Ray[] {
  const stride = 1 << (grid.weights.length - 1 - level);
  return Array.from(grid.weights[level]).flatMap((energy, index) =>
    sampler.surfaceIndex(index * stride).map(({ weight, n, k }) => ({
      weight: energy * weight,
      wavelengthM: grid.wavelengthM[index * stride],
      optics: rayOptics(n, k),
    })),
  );
}

function rayMean(rays: Ray[], radiusM: number): Means {
  const pair = new Float64Array(2);
  let qPr = 0;
  let qAbs = 0;
  for (const { weight, wavelengthM, optics } of rays) {
    optics.at(pair, (2 * Math.PI * radiusM) / wavelengthM);
    qPr += weight * pair[0];
    qAbs += weight * pair[1];
  }
  return { qPr, qAbs };
}

function dot(a: number[], b: number[]): number {
  return a.reduce((sum, value, index) => sum + value * b[index], 0);
}
