import { coatedTail } from './coated-tail';
import { curveNotes } from './curve-notes';
import { grainSampler } from './grain-sampler';
import { largeGrainTail } from './large-grain-tail';
import type { OpticsRecipe } from './materials';
import { mieNodes } from './mie-nodes';
import { narrowFeatures } from './narrow-features';
import { LN_RADIUS_MIN, LN_RADIUS_STEP, indexOfRadius } from './radius-grid';
import { resampledCoefficients } from './resample';
import { medianWavelengthM, shareOutside } from './spectral-grid';
import { spectralGrid, type Spectrum } from './spectrum';
import { clarityOf } from './clarity';

export { qabsAt, qprAt, qprAtMany } from './curve-value';
export { decodeCurve, encodeCurve } from './curve-bytes';

/**
 * Spectrum-averaged efficiencies against the grain radius (m) on a uniform grid in ln radius. On interval i, with t from
 * 0 to 1, ln <Q_pr> = c0 + t (c1 + t (c2 + t c3)), c = coefficients[4 i .. 4 i + 3]; `absorption` holds ln <Q_abs> alike.
 */
export interface Curve {
  lnRadiusMin: number;
  lnRadiusStep: number;
  coefficients: Float64Array;
  absorption: Float64Array;
  /** Relative error of <Q_pr> on the grid, from the differences seen while building, never below the design accuracy. */
  relativeErrorBound: number;
  /** Share of the spectrum's energy outside the wavelengths for which the optical constants are vouched for. */
  shareOutsideValidRange: number;
  /** True when the wavelength doubling ended at its limit before its tolerance was met at some radius. */
  capped: boolean;
  notes: string[];
}

export interface BuildOptions {
  /** Called with the share of the work done, 0 to 1, never decreasing. */
  onProgress?: (share: number) => void;
  /** Asked before each radius; when true the build throws `CurveCancelled`. */
  isCancelled?: () => boolean;
}

export class CurveCancelled extends Error {
  constructor() {
    super('The efficiency curve was cancelled while it was being built.');
    this.name = 'CurveCancelled';
  }
}

/** Median wavelength of a 5772 K black body; the tail's start is given for it and scales with the spectrum's own. */
const REFERENCE_MEDIAN_M = 0.711e-6;
const TAIL_START_M = { opaque: 80e-6, hazy: 120e-6, clear: 120e-6 };
const COATED_TAIL_START_M = 40e-6;
const TAIL_ALIGNMENT = 16;
const LEAST_ERROR = { opaque: 1e-4, hazy: 2e-4, clear: 1e-3 };

/**
 * Builds <Q_pr>(s) and <Q_abs>(s) of a recipe in a spectrum for radii from 1 nm to 1 cm.
 *
 * Mie means on nested wavelength grids up to s = 80 um (120 um if not opaque; at 5772 K, scaled with the median wavelength), beyond that ray
 * optics plus inverse powers of s fitted to the Mie means below; radii are added where the spline through the known ones
 * misses a new one. Error: 1e-4 for absorbing, 1e-3 for transparent materials (2e-3 under a mantle), see `relativeErrorBound`. Effective
 * temperatures 2000 to 60 000 K. Sources: Bohren & Huffman (1983), chapter 4; Burns, Lamy & Soter (1979), Icarus 40, 1.
 */
export function buildCurve(recipe: OpticsRecipe, spectrum: Spectrum, options: BuildOptions = {}): Curve {
  const clarity = clarityOf(recipe, spectrum);
  const grid = spectralGrid(spectrum, clarity.lastLevel + 1, narrowFeatures(recipe));
  const sampler = grainSampler(recipe, grid.wavelengthM);
  const median = medianWavelengthM(grid);
  const tailStartM = sampler.isCoated ? COATED_TAIL_START_M : TAIL_START_M[clarity.kind];
  const tailIndex = indexOfRadius((tailStartM * median) / REFERENCE_MEDIAN_M, TAIL_ALIGNMENT);

  const mie = mieNodes(sampler, grid, clarity, tailIndex, (share) => {
    if (options.isCancelled?.() === true) throw new CurveCancelled();
    options.onProgress?.(share);
  });
  const tail = sampler.isCoated
    ? coatedTail(sampler, grid, clarity, tailIndex)
    : largeGrainTail(sampler, grid, clarity, mie.nodes, tailIndex);
  const nodes = [...mie.nodes, ...tail.nodes];
  const share = shareOutside(grid, validUm(recipe));
  options.onProgress?.(1);
  return {
    lnRadiusMin: LN_RADIUS_MIN,
    lnRadiusStep: LN_RADIUS_STEP,
    coefficients: resampledCoefficients(nodes.map(({ index, qPr }) => [index, qPr])),
    absorption: resampledCoefficients(nodes.map(({ index, qAbs }) => [index, qAbs])),
    relativeErrorBound: Math.max(LEAST_ERROR[clarity.kind], mie.relativeError, tail.relativeError),
    shareOutsideValidRange: share,
    capped: mie.capped,
    notes: curveNotes(share, mie.capped, clarity.kind),
  };
}

/** Wavelengths (um) for which every material of the recipe is vouched for. */
function validUm({ core, mantle }: OpticsRecipe): [number, number] {
  if (mantle === undefined) return core.validUm;
  return [Math.max(core.validUm[0], mantle.optics.validUm[0]), Math.min(core.validUm[1], mantle.optics.validUm[1])];
}
