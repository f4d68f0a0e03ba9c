import { grainSampler } from './grain-sampler';
import type { OpticsRecipe } from './materials';
import type { DoublingRule } from './spectral-mean';
import { spectralGrid, type Spectrum } from './spectrum';

/** How clear the material is where the star shines, and how finely wavelengths must therefore be sampled. */
export interface Clarity {
  kind: 'opaque' | 'hazy' | 'clear';
  rule: DoublingRule;
  /** Wavelength level of the ray-optics means; opaque bodies need few, weak absorption bands need to be resolved. */
  rayLevel: number;
}

const PROBE_LEVELS = 4;
const CLEAR_K = 2e-3;
const HAZY_K = 2e-2;
const SHARE_THAT_COUNTS = 0.01;

/**
 * Mie resonances are about 2 k/n wide in ln wavelength. Measured over the 22 library materials and k = 1e-8 at 5772 K:
 * opaque ones settle to 1e-5 with 128 to 512 wavelengths, hazy ones with 1024 to 4096; clear ones still move by up to
 * 5e-4 at 4096 and 3e-4 at 8192, and differences below 2048 deceive.
 */
export function clarityOf(recipe: OpticsRecipe, spectrum: Spectrum): Clarity {
  const grid = spectralGrid(spectrum, PROBE_LEVELS);
  const sampler = grainSampler(recipe, grid.wavelengthM);
  const weights = grid.weights[PROBE_LEVELS - 1];
  let clear = 0;
  let hazy = 0;
  weights.forEach((weight, node) => {
    const k = Math.min(...sampler.surfaceIndex(node).map((component) => component.k));
    if (k < CLEAR_K) clear += weight;
    if (k < HAZY_K) hazy += weight;
  });
  if (clear > SHARE_THAT_COUNTS)
    return { kind: 'clear', rule: { firstLevel: 7, lastLevel: 9, relativeTolerance: 2.5e-4 }, rayLevel: 6 };
  if (hazy > SHARE_THAT_COUNTS)
    return { kind: 'hazy', rule: { firstLevel: 4, lastLevel: 8, relativeTolerance: 5e-5 }, rayLevel: 4 };
  return { kind: 'opaque', rule: { firstLevel: 2, lastLevel: 7, relativeTolerance: 5e-5 }, rayLevel: 2 };
}
