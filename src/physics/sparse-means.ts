import type { GrainSampler } from './grain-sampler';
import { rayMean, raysOf, type Means } from './ray-mean';
import type { SpectralGrid } from './spectral-grid';

/** Mie means of a radius beside the ray-optics means that the same wavelengths give. */
export interface SparseMeans {
  mie: Means;
  ray: Means;
}

/** Prepares such means on the few wavelengths of one level: the difference needs far fewer than either mean. */
export function sparseMeans(
  sampler: GrainSampler,
  grid: SpectralGrid,
  level: number,
): (radiusM: number) => SparseMeans {
  const rays = raysOf(sampler, grid, level);
  const weights = grid.weights[level];
  const stride = 1 << (grid.weights.length - 1 - level);
  const pair = new Float64Array(2);
  return (radiusM) => {
    const mie = { qPr: 0, qAbs: 0 };
    weights.forEach((weight, position) => {
      sampler.sample(pair, radiusM, position * stride);
      mie.qPr += weight * pair[0];
      mie.qAbs += weight * pair[1];
    });
    return { mie, ray: rayMean(rays, radiusM) };
  };
}
