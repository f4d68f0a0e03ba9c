import { C2 } from './constants';
import type { NarrowFeature } from './narrow-features';
import { nodeDensity, type NodeDensity } from './node-density';
import { COARSEST_INTERVALS, type SpectralGrid } from './spectral-grid';

const LN_U_MIN = Math.log(0.01);
const LN_U_MAX = Math.log(40);
/** Share of the nodes laid evenly in ln u; the others crowd where the energy is, as ripples of clear grains need. */
const EVEN_SHARE = 0.3;
/** Centre and width of the crowd: the peak of u^4/(e^u - 1) and the logistic of the same half width. */
const ENERGY_CROWD = { centre: Math.log(3.92), width: 0.4 };
/** Crowds around narrow features are this many times wider than the features. */
const FEATURE_MARGIN = 2;

/**
 * Trapezoid nodes of a black body in a smooth variable t of `nodeDensity` over ln u. The integrand
 * Q u^4/(e^u - 1) dies out at both ends, so the rule converges exponentially for smooth Q. u = h c / (lambda k T) runs
 * from 0.01 to 40; the energy left out is 5e-8 below and 1e-12 above.
 */
export function planckGrid(teffK: number, levels: number, features: NarrowFeature[]): SpectralGrid {
  const intervals = COARSEST_INTERVALS << (levels - 1);
  const wavelengthM = new Float64Array(intervals + 1);
  const finest = new Float64Array(intervals + 1);
  const spacing = nodeDensity(
    LN_U_MIN,
    LN_U_MAX,
    EVEN_SHARE,
    ENERGY_CROWD,
    features.map((feature) => ({
      centre: Math.log(C2 / (feature.wavelengthM * teffK)),
      width: FEATURE_MARGIN * feature.relativeWidth,
    })),
  );
  const first = spacing.cumulative(LN_U_MIN);
  const last = spacing.cumulative(LN_U_MAX);
  let lnU = LN_U_MAX;
  for (let index = 0; index <= intervals; index++) {
    const target = last + ((first - last) * index) / intervals;
    lnU = index === intervals ? LN_U_MIN : solveCumulative(spacing, target, lnU);
    const u = Math.exp(lnU);
    wavelengthM[index] = C2 / (u * teffK);
    finest[index] = u ** 4 / Math.expm1(u) / spacing.density(lnU);
  }
  finest[0] *= 0.5;
  finest[intervals] *= 0.5;
  const weights = Array.from({ length: levels }, (_, level) => everyNth(finest, 1 << (levels - 1 - level)));
  return { wavelengthM, weights };
}

function solveCumulative({ cumulative, density }: NodeDensity, target: number, start: number): number {
  let low = LN_U_MIN;
  let high = LN_U_MAX;
  let lnU = start;
  for (let iteration = 0; iteration < 60; iteration++) {
    const excess = cumulative(lnU) - target;
    if (excess > 0) high = lnU;
    else low = lnU;
    const next = lnU - excess / density(lnU);
    const guarded = next > low && next < high ? next : 0.5 * (low + high);
    if (Math.abs(guarded - lnU) < 1e-13) return guarded;
    lnU = guarded;
  }
  return lnU;
}

function everyNth(values: Float64Array, stride: number): Float64Array {
  const chosen = new Float64Array((values.length - 1) / stride + 1);
  let total = 0;
  for (let index = 0; index < chosen.length; index++) total += chosen[index] = values[index * stride];
  for (let index = 0; index < chosen.length; index++) chosen[index] /= total;
  return chosen;
}
