import { coatedSeries } from './coated-series';
import type { Complex } from './complex';
import { G, mieInto, Q_ABS, Q_EXT, Q_PR, Q_SCA, type MieEfficiencies } from './mie';

const EXTRA_TERMS = 3;
/** Below it the ratios underflow; the small-particle laws hold to 1e-11 there. */
const SMALLEST_SERIES_X = 1e-6;

/** Mean density (kg m-3) of a coated grain from both densities and the mantle's share of the volume. Exact. */
export function meanDensityOfCoated({
  coreKgM3,
  mantleKgM3,
  mantleVolumeFraction,
}: {
  coreKgM3: number;
  mantleKgM3: number;
  mantleVolumeFraction: number;
}): number {
  return coreKgM3 + (mantleKgM3 - coreKgM3) * mantleVolumeFraction;
}

/** Core radius over total radius of a sphere whose mantle has this share of the volume. Exact. */
export const coreRadiusShare = (mantleVolumeFraction: number): number => Math.cbrt(1 - mantleVolumeFraction);

/**
 * Efficiencies of a sphere with a concentric mantle in vacuum. Size parameters of the core and of the whole, 0 < xCore <= xTotal
 * <= 1e5; indices n + ik, k >= 0. Stable for thin and thick mantles and for strong absorption (ratios only, nothing overflows).
 * Relative accuracy 1e-8 up to x = 1000; absorption is summed on its own, so that it stays accurate when k is tiny. Source: Bohren &
 * Huffman (1983), section 8.1, in the recurrences of Yang (2003), Appl. Opt. 42, 1710.
 */
export function coatedEfficiencies(
  xCore: number,
  xTotal: number,
  nCore: number,
  kCore: number,
  nMantle: number,
  kMantle: number,
): MieEfficiencies {
  const out = new Float64Array(5);
  coatedInto(out, xCore, xTotal, [nCore, kCore], [nMantle, kMantle]);
  return { qExt: out[Q_EXT], qSca: out[Q_SCA], qAbs: out[Q_ABS], g: out[G], qPr: out[Q_PR] };
}

/** Writes [qExt, qSca, qAbs, g, qPr] as `mieInto` does; inputs and accuracy as `coatedEfficiencies`. */
export function coatedInto(out: Float64Array, xCore: number, xTotal: number, core: Complex, mantle: Complex): void {
  if (xCore >= xTotal || (core[0] === mantle[0] && core[1] === mantle[1]))
    return mieInto(out, xTotal, core[0], core[1]);
  if (xTotal < SMALLEST_SERIES_X) return rayleighInto(out, xCore, xTotal, core, mantle);
  const terms = Math.ceil(xTotal + 4.05 * Math.cbrt(xTotal) + EXTRA_TERMS);
  coatedSeries(out, xCore, xTotal, core[0], core[1], mantle[0], mantle[1], terms);
  const perArea = 2 / (xTotal * xTotal);
  const asymmetryTimesScattering = 2 * perArea * out[G];
  out[Q_SCA] *= perArea;
  out[Q_ABS] *= perArea;
  out[Q_EXT] = out[Q_SCA] + out[Q_ABS];
  out[G] = out[Q_SCA] > 0 ? asymmetryTimesScattering / out[Q_SCA] : 0;
  out[Q_PR] = out[Q_EXT] - asymmetryTimesScattering;
}

/** Far below the wavelength absorption goes as x and scattering as x^4 (Bohren & Huffman, section 5.1), asymmetry as x^2. */
function rayleighInto(out: Float64Array, xCore: number, xTotal: number, core: Complex, mantle: Complex): void {
  const shrink = xTotal / SMALLEST_SERIES_X;
  coatedInto(out, xCore / shrink, SMALLEST_SERIES_X, core, mantle);
  out[Q_ABS] *= shrink;
  out[Q_SCA] *= shrink ** 4;
  out[G] *= shrink ** 2;
  out[Q_EXT] = out[Q_ABS] + out[Q_SCA];
  out[Q_PR] = out[Q_EXT] - out[G] * out[Q_SCA];
}
