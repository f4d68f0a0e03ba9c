import { logDerivatives } from './mie-log-derivative';
import { scaledPsi } from './mie-psi';

/** Below this size parameter psi_n is run downwards, which keeps every efficiency relatively accurate as x -> 0. */
const LARGEST_DOWNWARD_PSI_X = 3;

/**
 * Sums of the Mie series with D_n(mx) = psi_n'(mx)/psi_n(mx) recurred downwards: valid for every passive m and x.
 * Fills out[1] with S (2n+1)(|a|^2+|b|^2), out[2] with S (2n+1)(Re a - |a|^2 + Re b - |b|^2), out[3] with the asymmetry
 * sum. Source: Bohren & Huffman (1983), eq. 4.88; with A = D_n/m + n/x (for b_n: m D_n + n/x) the Wronskian of psi and
 * chi makes Re a - |a|^2 = -Im A / |A xi_n - xi_{n-1}|^2 exactly.
 */
export function downwardSeries(out: Float64Array, x: number, n: number, k: number, terms: number): void {
  const derivatives = logDerivatives(x, n, k, terms);
  const psiTable = x < LARGEST_DOWNWARD_PSI_X ? scaledPsi(x, terms) : null;
  const inverseX = 1 / x;
  const modulus2 = n * n + k * k;
  const inverseMr = n / modulus2;
  const inverseMi = -k / modulus2;

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
    const odd2 = 2 * order - 1;
    const step = odd2 * inverseX;
    const psi = psiTable === null ? step * psi1 - psi0 : psiTable[order];
    const chi = step * chi1 - chi0;
    const dr = derivatives[2 * order];
    const di = derivatives[2 * order + 1];
    const ratio = order * inverseX;

    let tr = dr * inverseMr - di * inverseMi + ratio;
    let ti = dr * inverseMi + di * inverseMr;
    let pr = tr * psi - psi1;
    let pi = ti * psi;
    let denominatorR = pr + ti * chi;
    let denominatorI = pi - tr * chi + chi1;
    let reciprocal = 1 / (denominatorR * denominatorR + denominatorI * denominatorI);
    const ar = (pr * denominatorR + pi * denominatorI) * reciprocal;
    const ai = (pi * denominatorR - pr * denominatorI) * reciprocal;
    let squares = (pr * pr + pi * pi) * reciprocal;
    let losses = -ti * reciprocal;

    tr = dr * n - di * k + ratio;
    ti = dr * k + di * n;
    pr = tr * psi - psi1;
    pi = ti * psi;
    denominatorR = pr + ti * chi;
    denominatorI = pi - tr * chi + chi1;
    reciprocal = 1 / (denominatorR * denominatorR + denominatorI * denominatorI);
    const br = (pr * denominatorR + pi * denominatorI) * reciprocal;
    const bi = (pi * denominatorR - pr * denominatorI) * reciprocal;
    squares += (pr * pr + pi * pi) * reciprocal;
    losses -= ti * reciprocal;

    const degeneracy = odd2 + 2;
    scattering += degeneracy * squares;
    absorption += degeneracy * losses;
    asymmetry +=
      (((order - 1) * (order + 1)) / order) * (lastAr * ar + lastAi * ai + lastBr * br + lastBi * bi) +
      (degeneracy / (order * (order + 1))) * (ar * br + ai * bi);

    lastAr = ar;
    lastAi = ai;
    lastBr = br;
    lastBi = bi;
    psi0 = psi1;
    psi1 = psi;
    chi0 = chi1;
    chi1 = chi;
  }
  out[1] = scattering;
  out[2] = absorption;
  out[3] = asymmetry;
}
