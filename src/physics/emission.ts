import { C2 } from './constants';
import { grainSampler, type GrainSampler } from './grain-sampler';
import type { OpticsRecipe } from './optics';
import { CURVE_RADIUS_MAX_M, CURVE_RADIUS_MIN_M } from './radius-grid';
import { rayOptics } from './ray-optics';

const LN_WAVELENGTH_MIN = Math.log(6e-8);
const LN_WAVELENGTH_MAX = Math.log(0.3);
/** Fine enough for the infrared resonances of small crystalline grains (about 2 % wide); twice as coarse errs by 6 %. */
const LN_WAVELENGTH_STEP = 0.01;
const RADII_PER_DECADE = 12;
const LN_T_STEP = 0.025;
/** Above this size parameter ray optics, scaled to meet Mie there, stands in. */
const LARGEST_MIE_X = 300;
const EDGE_POWER = 2 / 3;
const LEAST_Q = 1e-300;

export const TEMPERATURE_MIN_K = 2.7;
export const TEMPERATURE_MAX_K = 6000;

/** ln of the Planck mean of Q_abs over radii (rows) and temperatures (columns), both even in the logarithm. */
export interface Emission {
  lnRadiusMin: number;
  lnRadiusStep: number;
  radii: number;
  lnTMin: number;
  lnTStep: number;
  temperatures: number;
  lnQabs: Float64Array;
}

/**
 * Planck means <Q_abs>(s, T) of a recipe's own thermal radiation, radii 1 nm to 1 cm, temperatures 2.7 to 6000 K. The
 * optical constants are used at all wavelengths from 60 nm to 0.3 m, far outside what was measured for some materials. Relative error 0.5 %
 * (1.5 % at narrow infrared resonances and for grains of more than 300 wavelengths/2 pi), which is a quarter of that in temperature. Source: Bohren & Huffman (1983), section 4.7.
 */
export function buildEmission(recipe: OpticsRecipe): Emission {
  const wavelengths = Math.ceil((LN_WAVELENGTH_MAX - LN_WAVELENGTH_MIN) / LN_WAVELENGTH_STEP) + 1;
  const wavelengthM = Float64Array.from({ length: wavelengths }, (_, node) =>
    Math.exp(LN_WAVELENGTH_MIN + node * LN_WAVELENGTH_STEP),
  );
  const lnRadiusMin = Math.log(CURVE_RADIUS_MIN_M);
  const radii = Math.round(Math.log10(CURVE_RADIUS_MAX_M / CURVE_RADIUS_MIN_M) * RADII_PER_DECADE) + 1;
  const lnRadiusStep = Math.log(CURVE_RADIUS_MAX_M / CURVE_RADIUS_MIN_M) / (radii - 1);
  const temperatures = Math.ceil(Math.log(TEMPERATURE_MAX_K / TEMPERATURE_MIN_K) / LN_T_STEP) + 1;
  const lnTMin = Math.log(TEMPERATURE_MIN_K);

  const absorption = absorptionOf(grainSampler(recipe, wavelengthM), wavelengthM);
  const weights = planckWeights(wavelengthM, lnTMin, temperatures);
  const lnQabs = new Float64Array(radii * temperatures);
  const row = new Float64Array(wavelengths);
  for (let radius = 0; radius < radii; radius++) {
    const radiusM = Math.exp(lnRadiusMin + radius * lnRadiusStep);
    for (let node = 0; node < wavelengths; node++) row[node] = absorption(radiusM, node);
    for (let column = 0; column < temperatures; column++) {
      lnQabs[radius * temperatures + column] = Math.log(Math.max(LEAST_Q, mean(row, weights[column])));
    }
  }
  return { lnRadiusMin, lnRadiusStep, radii, lnTMin, lnTStep: LN_T_STEP, temperatures, lnQabs };
}

interface Weights {
  first: number;
  values: Float64Array;
}

/** Normalised weights u^4/(e^u - 1) per temperature, without the nodes that do not count. */
function planckWeights(wavelengthM: Float64Array, lnTMin: number, temperatures: number): Weights[] {
  return Array.from({ length: temperatures }, (_, column) => {
    const temperatureK = Math.exp(lnTMin + column * LN_T_STEP);
    const all = wavelengthM.map((wavelength) => {
      const u = C2 / (wavelength * temperatureK);
      return u > 60 ? 0 : u ** 4 / Math.expm1(u);
    });
    const total = all.reduce((sum, weight) => sum + weight, 0);
    const counts = (weight: number) => weight > 1e-12 * total;
    const first = all.findIndex(counts);
    const last = all.findLastIndex(counts);
    return { first, values: all.slice(first, last + 1).map((weight) => weight / total) };
  });
}

function mean(row: Float64Array, { first, values }: Weights): number {
  let sum = 0;
  for (let index = 0; index < values.length; index++) sum += values[index] * row[first + index];
  return sum;
}

/** Q_abs at a radius and node: Mie up to a size parameter, scaled ray optics beyond. */
function absorptionOf(sampler: GrainSampler, wavelengthM: Float64Array): (radiusM: number, node: number) => number {
  const pair = new Float64Array(2);
  const mie = (radiusM: number, node: number) => {
    sampler.sample(pair, radiusM, node);
    return pair[1];
  };
  const large = new Map<number, (x: number) => number>();
  return (radiusM, node) => {
    const x = (2 * Math.PI * radiusM) / wavelengthM[node];
    if (x <= LARGEST_MIE_X) return mie(radiusM, node);
    const known =
      large.get(node) ?? largeAbsorption(sampler, node, mie((LARGEST_MIE_X * wavelengthM[node]) / (2 * Math.PI), node));
    large.set(node, known);
    return known(x);
  };
}

function largeAbsorption(sampler: GrainSampler, node: number, mieAtLimit: number): (x: number) => number {
  const pair = new Float64Array(2);
  const surfaces = sampler.surfaceIndex(node).map(({ weight, n, k }) => ({ weight, optics: rayOptics(n, k) }));
  const ray = (x: number) =>
    surfaces.reduce((sum, { weight, optics }) => {
      optics.at(pair, x);
      return sum + weight * pair[1];
    }, 0);
  const atLimit = ray(LARGEST_MIE_X);
  const excess = atLimit > 0 ? mieAtLimit / atLimit - 1 : 0;
  // Edge terms die out; what a mantle lets through to the core does not.
  const power = sampler.isCoated ? 0 : EDGE_POWER;
  return (x) => ray(x) * (1 + excess * (LARGEST_MIE_X / x) ** power);
}
