import { grainSampler } from './grain-sampler';
import type { OpticsRecipe } from './materials';
import type { DoublingRule } from './spectral-mean';
import { spectralGrid, type Spectrum } from './spectrum';

/** How clear the material is where the star shines, and how finely wavelengths must therefore be sampled. */
export interface Clarity {
  kind: keyof typeof rules;
  /** Rule for grains of one radius: light that dies on its way through a grain makes no ripples. */
  ruleAt(radiusM: number): DoublingRule;
  /** Finest level that a rule may ask for. */
  lastLevel: number;
  /** Wavelength level of the ray-optics means; opaque bodies need few, weak absorption bands need to be resolved. */
  rayLevel: number;
}

const PROBE_LEVELS = 4;
const CLEAR_K = 2e-3;
const HAZY_K = 2e-2;
const SHARE_THAT_COUNTS = 0.01;
/** Resonances need total reflection inside: below this index grains of any size had none that showed. */
const LEAST_RESONANT_N = 1.1;
/** Optical depth along the diameter from which no ripple is left. */
const DARK_DEPTH = 6;

/**
 * Mie resonances are about 2 k/n wide in ln wavelength. Measured over the 22 library materials and k = 1e-8 at 5772 K:
 * opaque ones settle to 1e-5 with 128 to 512 wavelengths, hazy ones with 1024 to 4096; clear ones still move by up to
 * 5e-4 at 4096 and 3e-4 at 8192, and differences below 2048 deceive.
 */
const rules = {
  opaque: { firstLevel: 2, lastLevel: 7, relativeTolerance: 5e-5 },
  hazy: { firstLevel: 4, lastLevel: 8, relativeTolerance: 5e-5 },
  clear: { firstLevel: 7, lastLevel: 9, relativeTolerance: 2.5e-4 },
} satisfies Record<string, DoublingRule>;

/** The series of a coated sphere costs so much more that a clear mantle gets fewer wavelengths, and a wider error bound. */
const coatedRules = {
  ...rules,
  clear: { firstLevel: 5, lastLevel: 7, relativeTolerance: 5e-4 },
} satisfies typeof rules;

const rayLevels = { opaque: 2, hazy: 3, clear: 6 };

/** Clarity of a recipe in a spectrum, from the optical constants of what light meets first. */
export function clarityOf(recipe: OpticsRecipe, spectrum: Spectrum): Clarity {
  const { wavelengthM, weights } = spectralGrid(spectrum, PROBE_LEVELS);
  const sampler = grainSampler(recipe, wavelengthM);
  const light = Array.from(weights[PROBE_LEVELS - 1]).flatMap((weight, node) => {
    const resonant = sampler.surfaceIndex(node).filter(({ n }) => n > LEAST_RESONANT_N);
    const k = Math.min(...resonant.map((component) => component.k));
    return k < HAZY_K ? [{ weight, k, depthPerM: (8 * Math.PI * k) / wavelengthM[node] }] : [];
  });
  const kindAt = (radiusM: number): Clarity['kind'] => {
    let clear = 0;
    let hazy = 0;
    for (const { weight, k, depthPerM } of light) {
      if (depthPerM * radiusM > DARK_DEPTH) continue;
      hazy += weight;
      if (k < CLEAR_K) clear += weight;
    }
    if (clear > SHARE_THAT_COUNTS) return 'clear';
    return hazy > SHARE_THAT_COUNTS ? 'hazy' : 'opaque';
  };
  const kind = kindAt(0);
  const own = recipe.mantle === undefined ? rules : coatedRules;
  return {
    kind,
    ruleAt: (radiusM) => own[kindAt(radiusM)],
    lastLevel: Math.max(own[kind].lastLevel, own.opaque.lastLevel),
    rayLevel: rayLevels[kind],
  };
}
