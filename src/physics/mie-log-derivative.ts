/** Absorption depth k x from which the asymptotic start is accurate to 2e-12 after the margin below. */
const ASYMPTOTIC_DEPTH = 20;
const ASYMPTOTIC_MARGIN = 60;

let table = new Float64Array(256);

/**
 * D_1 .. D_terms of z = m x, interleaved (real at 2n, imaginary at 2n + 1), D_n(z) = psi_n'(z)/psi_n(z), by downward
 * recurrence D_{n-1} = n/z - 1/(D_n + n/z). The array is reused by the next call.
 *
 * The start is max(terms, |z|) + 8 |z|^(1/3) + 16: a start only 15 above leaves relative errors up to 1e-3 in weakly
 * absorbing large spheres. Where k x >= 20 the Debye form D ~ -i sqrt(1 - ((n + 1/2)/z)^2) (Abramowitz & Stegun 9.3.7)
 * lets the run start 60 above the last wanted order instead of above |z|.
 */
export function logDerivatives(x: number, n: number, k: number, terms: number): Float64Array {
  if (table.length < 2 * terms + 2) table = new Float64Array(4 * terms + 4);
  const zModulus = Math.sqrt(n * n + k * k) * x;
  const safeStart = Math.ceil(Math.max(terms, zModulus) + 8 * Math.cbrt(zModulus) + 16);
  const asymptoticStart = terms + ASYMPTOTIC_MARGIN;
  const scale = 1 / (zModulus * zModulus);
  const inverseZr = n * x * scale;
  const inverseZi = -k * x * scale;

  let order = safeStart;
  let dr = 0;
  let di = 0;
  if (k * x >= ASYMPTOTIC_DEPTH && asymptoticStart < safeStart) {
    order = asymptoticStart;
    const half = order + 0.5;
    const sr = 1 - half * half * (inverseZr * inverseZr - inverseZi * inverseZi);
    const si = -2 * half * half * inverseZr * inverseZi;
    const modulus = Math.hypot(sr, si);
    const rootR = Math.sqrt(0.5 * (modulus + Math.abs(sr)));
    const rootI = si / (2 * rootR);
    const realPart = sr >= 0 ? rootR : Math.abs(rootI);
    const imaginaryPart = sr >= 0 ? rootI : Math.sign(si) * rootR;
    dr = imaginaryPart;
    di = -realPart;
  }
  for (; order > terms; order--) {
    const qr = order * inverseZr;
    const qi = order * inverseZi;
    const er = dr + qr;
    const ei = di + qi;
    const reciprocal = 1 / (er * er + ei * ei);
    dr = qr - er * reciprocal;
    di = qi + ei * reciprocal;
  }
  table[2 * terms] = dr;
  table[2 * terms + 1] = di;
  for (; order > 1; order--) {
    const qr = order * inverseZr;
    const qi = order * inverseZi;
    const er = dr + qr;
    const ei = di + qi;
    const reciprocal = 1 / (er * er + ei * ei);
    dr = qr - er * reciprocal;
    di = qi + ei * reciprocal;
    table[2 * order - 2] = dr;
    table[2 * order - 1] = di;
  }
  return table;
}
