import { add, divide, multiply, scale, subtract, type Complex } from './complex';
import { logDerivatives } from './mie-log-derivative';
import { G, mieInto, Q_ABS, Q_EXT, Q_PR, Q_SCA, type MieEfficiencies } from './mie';
import { scaledPsi } from './mie-psi';

const EXTRA_TERMS = 3;
/** Below it the ratios underflow; the small-particle laws hold to 1e-11 there. */
const SMALLEST_SERIES_X = 1e-6;
/** As in the homogeneous sphere: below it psi_n is run downwards. */
const LARGEST_DOWNWARD_PSI_X = 3;

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

/** D_n of psi: a copy, because the table is shared. */
function psiDerivatives(x: number, [n, k]: Complex, terms: number): Float64Array {
  return logDerivatives(x, n, k, terms).slice(0, 2 * terms + 2);
}

const at = (table: Float64Array, order: number): Complex => [table[2 * order], table[2 * order + 1]];

/** D_n of zeta, by the stable upward product of psi and zeta. */
function zetaDerivatives(z: Complex, psi: Float64Array, terms: number): Complex[] {
  const [a, b] = z;
  const decay = Math.exp(-2 * b);
  let product: Complex = [0.5 * (1 - Math.cos(2 * a) * decay), -0.5 * Math.sin(2 * a) * decay];
  let derivative: Complex = [0, 1];
  const table: Complex[] = [derivative];
  // D_0 of psi is cot z.
  let psiBefore: Complex = cotangent(z);
  for (let order = 1; order <= terms; order++) {
    const ratio = divide([order, 0], z);
    product = multiply(product, multiply(subtract(ratio, psiBefore), subtract(ratio, derivative)));
    psiBefore = at(psi, order);
    derivative = add(psiBefore, divide([0, 1], product));
    table.push(derivative);
  }
  return table;
}

/** cot z = i (1 + q)/(1 - q) with q = exp(2 i z) conjugated to what stays finite for Im z >= 0. */
function cotangent([a, b]: Complex): Complex {
  const decay = Math.exp(-2 * b);
  const q: Complex = [Math.cos(2 * a) * decay, Math.sin(2 * a) * decay];
  return multiply([0, 1], divide(add(q, [1, 0]), subtract(q, [1, 0])));
}

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
  const derivatives = layerDerivatives(xCore, xTotal, core, mantle, terms);
  const psiTable = xTotal < LARGEST_DOWNWARD_PSI_X ? scaledPsi(xTotal, terms) : null;
  let psi0 = Math.cos(xTotal);
  let psi1 = Math.sin(xTotal);
  let chi0 = -psi1;
  let chi1 = psi0;
  let scattering = 0;
  let absorption = 0;
  let asymmetry = 0;
  let last: [Coefficient, Coefficient] = [NO_COEFFICIENT, NO_COEFFICIENT];
  for (let order = 1; order <= terms; order++) {
    const step = (2 * order - 1) / xTotal;
    const psi = psiTable ? psiTable[order] : step * psi1 - psi0;
    const chi = step * chi1 - chi0;
    const ratio: Complex = [order / xTotal, 0];
    const [hA, hB] = derivatives.next();
    const a = coefficient(add(divide(hA, mantle), ratio), psi, psi1, chi, chi1);
    const b = coefficient(add(multiply(hB, mantle), ratio), psi, psi1, chi, chi1);
    const degeneracy = 2 * order + 1;
    scattering += degeneracy * (a.square + b.square);
    absorption += degeneracy * (a.loss + b.loss);
    asymmetry +=
      (((order - 1) * (order + 1)) / order) * (inner(last[0], a) + inner(last[1], b)) +
      (degeneracy / (order * (order + 1))) * inner(a, b);
    last = [a, b];
    psi0 = psi1;
    psi1 = psi;
    chi0 = chi1;
    chi1 = chi;
  }
  const perArea = 2 / (xTotal * xTotal);
  const asymmetryTimesScattering = 2 * perArea * asymmetry;
  out[Q_SCA] = perArea * scattering;
  out[Q_ABS] = perArea * absorption;
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

/** Logarithmic derivatives at the outer face for the two polarisations, order after order from 1. */
function layerDerivatives(
  xCore: number,
  xTotal: number,
  core: Complex,
  mantle: Complex,
  terms: number,
): { next(): [Complex, Complex] } {
  const z1 = scale(mantle, xCore);
  const z2 = scale(mantle, xTotal);
  const coreD = psiDerivatives(xCore, core, terms);
  const innerD = psiDerivatives(xCore, mantle, terms);
  const outerD = psiDerivatives(xTotal, mantle, terms);
  const innerZeta = zetaDerivatives(z1, innerD, terms);
  const outerZeta = zetaDerivatives(z2, outerD, terms);
  const sizeShare = (xCore / xTotal) ** 2;
  let q = firstRatio(z1, z2);
  let order = 0;
  return {
    next() {
      order += 1;
      const [coreAt, innerAt, outerAt] = [at(coreD, order), at(innerD, order), at(outerD, order)];
      const growth = divide(
        multiply(add(multiply(z2, outerAt), [order, 0]), subtract([order, 0], multiply(z2, outerZeta[order - 1]))),
        multiply(add(multiply(z1, innerAt), [order, 0]), subtract([order, 0], multiply(z1, innerZeta[order - 1]))),
      );
      q = multiply(scale(q, sizeShare), growth);
      const faces = [coreAt, innerAt, innerZeta[order], outerAt, outerZeta[order], q] as const;
      return [layer(mantle, core, ...faces), layer(core, mantle, ...faces)];
    },
  };
}

/** psi_n zeta ratios at the mantle's two faces, order 0. */
function firstRatio(z1: Complex, z2: Complex): Complex {
  const thinner = Math.exp(-2 * (z2[1] - z1[1]));
  const face = ([a, b]: Complex): Complex => [Math.cos(2 * a) - Math.exp(-2 * b), -Math.sin(2 * a)];
  return scale(divide(face(z1), face(z2)), thinner);
}

/** Logarithmic derivative at the outer face, seen from the inner one; the two polarisations swap the indices. */
function layer(
  outside: Complex,
  inside: Complex,
  core: Complex,
  inner: Complex,
  innerZeta: Complex,
  outer: Complex,
  outerZeta: Complex,
  q: Complex,
): Complex {
  const g1 = subtract(multiply(outside, core), multiply(inside, inner));
  const g2 = subtract(multiply(outside, core), multiply(inside, innerZeta));
  const weighted = multiply(q, g1);
  return divide(subtract(multiply(g2, outer), multiply(weighted, outerZeta)), subtract(g2, weighted));
}

interface Coefficient {
  re: number;
  im: number;
  square: number;
  /** Re a - |a|^2, from the Wronskian of psi and chi: no difference of nearly equal numbers. */
  loss: number;
}
const NO_COEFFICIENT: Coefficient = { re: 0, im: 0, square: 0, loss: 0 };

const inner = (a: Coefficient, b: Coefficient): number => a.re * b.re + a.im * b.im;

function coefficient(t: Complex, psi: number, psiBefore: number, chi: number, chiBefore: number): Coefficient {
  const pr = t[0] * psi - psiBefore;
  const pi = t[1] * psi;
  // xi = psi - i chi
  const dr = pr + t[1] * chi;
  const di = pi - t[0] * chi + chiBefore;
  const reciprocal = 1 / (dr * dr + di * di);
  return {
    re: (pr * dr + pi * di) * reciprocal,
    im: (pi * dr - pr * di) * reciprocal,
    square: (pr * pr + pi * pi) * reciprocal,
    loss: -t[1] * reciprocal,
  };
}
