import type { GrainSampler } from './grain-sampler';
import { rayOptics, type RayOptics } from './ray-optics';
import type { SpectralGrid } from './spectral-grid';

/** Spectral means of one radius. */
export interface Means {
  qPr: number;
  qAbs: number;
}

/** Light of one wavelength and component, with its share of the energy. */
export interface Ray {
  weight: number;
  wavelengthM: number;
  optics: RayOptics;
}

/** Ray optics of a grain's surface at the wavelengths of one level of the grid. */
export function raysOf(sampler: GrainSampler, grid: SpectralGrid, level: number): Ray[] {
  const stride = 1 << (grid.weights.length - 1 - level);
  return Array.from(grid.weights[level]).flatMap((energy, index) =>
    sampler.surfaceIndex(index * stride).map(({ weight, n, k }) => ({
      weight: energy * weight,
      wavelengthM: grid.wavelengthM[index * stride],
      optics: rayOptics(n, k),
    })),
  );
}

/** Spectral mean of ray optics for a radius in m. */
export function rayMean(rays: Ray[], radiusM: number): Means {
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
