import { logDerivatives } from './mie-log-derivative';
import { scaledPsi } from './mie-psi';

/** As in the homogeneous sphere: below it psi_n is run downwards. */
const LARGEST_DOWNWARD_PSI_X = 3;
const TABLES = 5;

let space = new Float64Array(TABLES * 256);

/**
 * Sums of the Mie series of a sphere with a concentric mantle; fills out[1], out[2] and out[3] as `downwardSeries` does. Complex
 * arithmetic is written out on reused tables: with objects it takes ten times as long.
 * Source: Bohren & Huffman (1983), section 8.1, in the recurrences of Yang (2003), Appl. Opt. 42, 1710, eq. 3, 7-10, 28.
 */
export function coatedSeries(
  out: Float64Array,
  xCore: number,
  x: number,
  nCore: number,
  kCore: number,
  n: number,
  k: number,
  terms: number,
): void {
  const size = 2 * terms + 2;
  if (space.length < TABLES * size) space = new Float64Array(2 * TABLES * size);
  const table = (index: number) => space.subarray(index * size, (index + 1) * size);
  const [coreD, innerD, outerD, innerZ, outerZ] = [table(0), table(1), table(2), table(3), table(4)];
  coreD.set(logDerivatives(xCore, nCore, kCore, terms).subarray(0, size));
  innerD.set(logDerivatives(xCore, n, k, terms).subarray(0, size));
  outerD.set(logDerivatives(x, n, k, terms).subarray(0, size));
  const [z1r, z1i, z2r, z2i] = [n * xCore, k * xCore, n * x, k * x];
  zetaDerivatives(innerZ, z1r, z1i, innerD, terms);
  zetaDerivatives(outerZ, z2r, z2i, outerD, terms);

  const sizeShare = (xCore / x) ** 2;
  let [qr, qi] = firstRatio(z1r, z1i, z2r, z2i);
  const psiTable = x < LARGEST_DOWNWARD_PSI_X ? scaledPsi(x, terms) : null;
  const mantle2 = n * n + k * k;
  let psi0 = Math.cos(x);
  let psi1 = Math.sin(x);
  let chi0 = -psi1;
  let chi1 = psi0;
  let scattering = 0;
  let absorption = 0;
  let asymmetry = 0;
  let lastAr = 0;
  let lastAi = 0;
  let lastBr = 0;
  let lastBi = 0;
  for (let order = 1; order <= terms; order++) {
    const at = 2 * order;
    const cr = coreD[at];
    const ci = coreD[at + 1];
    const ir = innerD[at];
    const ii = innerD[at + 1];
    const er = outerD[at];
    const ei = outerD[at + 1];

    // q grows by (z2 D + n)(n - z2 Z')/((z1 D + n)(n - z1 Z')), Z' one order below.
    const ar = z2r * er - z2i * ei + order;
    const ai = z2r * ei + z2i * er;
    const br = order - (z2r * outerZ[at - 2] - z2i * outerZ[at - 1]);
    const bi = -(z2r * outerZ[at - 1] + z2i * outerZ[at - 2]);
    const dr = z1r * ir - z1i * ii + order;
    const di = z1r * ii + z1i * ir;
    const fr = order - (z1r * innerZ[at - 2] - z1i * innerZ[at - 1]);
    const fi = -(z1r * innerZ[at - 1] + z1i * innerZ[at - 2]);
    const nr = ar * br - ai * bi;
    const ni = ar * bi + ai * br;
    const mr = dr * fr - di * fi;
    const mi = dr * fi + di * fr;
    const perM = sizeShare / (mr * mr + mi * mi);
    const gr = (nr * mr + ni * mi) * perM;
    const gi = (ni * mr - nr * mi) * perM;
    const wasQr = qr;
    qr = wasQr * gr - qi * gi;
    qi = wasQr * gi + qi * gr;

    const step = (2 * order - 1) / x;
    const psi = psiTable === null ? step * psi1 - psi0 : psiTable[order];
    const chi = step * chi1 - chi0;
    const ratio = order / x;
    const zr = innerZ[at];
    const zi = innerZ[at + 1];
    const or = outerZ[at];
    const oi = outerZ[at + 1];

    // Logarithmic derivative at the outer face, electric terms: mantle outside, core inside.
    let pr = n * cr - k * ci;
    let pi = n * ci + k * cr;
    let g1r = pr - (nCore * ir - kCore * ii);
    let g1i = pi - (nCore * ii + kCore * ir);
    let g2r = pr - (nCore * zr - kCore * zi);
    let g2i = pi - (nCore * zi + kCore * zr);
    let wr = qr * g1r - qi * g1i;
    let wi = qr * g1i + qi * g1r;
    let tr = g2r * er - g2i * ei - (wr * or - wi * oi);
    let ti = g2r * ei + g2i * er - (wr * oi + wi * or);
    let sr = g2r - wr;
    let si = g2i - wi;
    let per = 1 / (sr * sr + si * si);
    let hr = (tr * sr + ti * si) * per;
    let hi = (ti * sr - tr * si) * per;
    tr = (hr * n + hi * k) / mantle2 + ratio;
    ti = (hi * n - hr * k) / mantle2;
    let ur = tr * psi - psi1;
    let ui = ti * psi;
    let vr = ur + ti * chi;
    let vi = ui - tr * chi + chi1;
    per = 1 / (vr * vr + vi * vi);
    const aR = (ur * vr + ui * vi) * per;
    const aI = (ui * vr - ur * vi) * per;
    let squares = (ur * ur + ui * ui) * per;
    let losses = -ti * per;

    // Magnetic terms: the indices change places.
    pr = nCore * cr - kCore * ci;
    pi = nCore * ci + kCore * cr;
    g1r = pr - (n * ir - k * ii);
    g1i = pi - (n * ii + k * ir);
    g2r = pr - (n * zr - k * zi);
    g2i = pi - (n * zi + k * zr);
    wr = qr * g1r - qi * g1i;
    wi = qr * g1i + qi * g1r;
    tr = g2r * er - g2i * ei - (wr * or - wi * oi);
    ti = g2r * ei + g2i * er - (wr * oi + wi * or);
    sr = g2r - wr;
    si = g2i - wi;
    per = 1 / (sr * sr + si * si);
    hr = (tr * sr + ti * si) * per;
    hi = (ti * sr - tr * si) * per;
    tr = hr * n - hi * k + ratio;
    ti = hr * k + hi * n;
    ur = tr * psi - psi1;
    ui = ti * psi;
    vr = ur + ti * chi;
    vi = ui - tr * chi + chi1;
    per = 1 / (vr * vr + vi * vi);
    const bR = (ur * vr + ui * vi) * per;
    const bI = (ui * vr - ur * vi) * per;
    squares += (ur * ur + ui * ui) * per;
    losses -= ti * per;

    const degeneracy = 2 * order + 1;
    scattering += degeneracy * squares;
    absorption += degeneracy * losses;
    asymmetry +=
      (((order - 1) * (order + 1)) / order) * (lastAr * aR + lastAi * aI + lastBr * bR + lastBi * bI) +
      (degeneracy / (order * (order + 1))) * (aR * bR + aI * bI);
    lastAr = aR;
    lastAi = aI;
    lastBr = bR;
    lastBi = bI;
    psi0 = psi1;
    psi1 = psi;
    chi0 = chi1;
    chi1 = chi;
  }
  out[1] = scattering;
  out[2] = absorption;
  out[3] = asymmetry;
}

/** D_n of zeta into a table, interleaved, by the stable upward product of psi and zeta; `psi` holds D_n of psi. */
function zetaDerivatives(into: Float64Array, zr: number, zi: number, psi: Float64Array, terms: number): void {
  const decay = Math.exp(-2 * zi);
  // psi zeta of order 0 is (1 - exp(2 i z))/2, here without cancellation for small z.
  let productR = Math.sin(zr) ** 2 * decay - 0.5 * Math.expm1(-2 * zi);
  let productI = -0.5 * Math.sin(2 * zr) * decay;
  let derivativeR = 0;
  let derivativeI = 1;
  const scale = 1 / (zr * zr + zi * zi);
  into[0] = derivativeR;
  into[1] = derivativeI;
  for (let order = 1; order <= terms; order++) {
    const ratioR = order * zr * scale;
    const ratioI = -order * zi * scale;
    const psiR = psi[2 * order];
    const psiI = psi[2 * order + 1];
    // psi_n/psi_(n-1) as 1/(D_n + n/z): n/z - D_(n-1) would cancel for small z.
    const ar = psiR + ratioR;
    const ai = psiI + ratioI;
    const br = ratioR - derivativeR;
    const bi = ratioI - derivativeI;
    const perA = 1 / (ar * ar + ai * ai);
    const cr = (br * ar + bi * ai) * perA;
    const ci = (bi * ar - br * ai) * perA;
    const wasR = productR;
    productR = wasR * cr - productI * ci;
    productI = wasR * ci + productI * cr;
    const perProduct = 1 / (productR * productR + productI * productI);
    derivativeR = psiR + productI * perProduct;
    derivativeI = psiI + productR * perProduct;
    into[2 * order] = derivativeR;
    into[2 * order + 1] = derivativeI;
  }
}

/** Ratio of psi/zeta at the mantle's two faces, order 0. */
function firstRatio(z1r: number, z1i: number, z2r: number, z2i: number): [number, number] {
  const thinner = Math.exp(-2 * (z2i - z1i));
  const [ar, ai] = [-2 * Math.sin(z1r) ** 2 - Math.expm1(-2 * z1i), -Math.sin(2 * z1r)];
  const [br, bi] = [-2 * Math.sin(z2r) ** 2 - Math.expm1(-2 * z2i), -Math.sin(2 * z2r)];
  const per = thinner / (br * br + bi * bi);
  return [(ar * br + ai * bi) * per, (ai * br - ar * bi) * per];
}
