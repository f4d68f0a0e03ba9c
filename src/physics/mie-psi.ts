const EXTRA_TERMS = 16;
let table = new Float64Array(64);

/**
 * psi_0 .. psi_terms of a small argument x (below pi) by the downward ratio r_n = psi_n/psi_{n-1} = 1/((2n+1)/x - r_{n+1}),
 * which keeps full relative accuracy where the upward recurrence loses it. The array is reused by the next call.
 * Source: Abramowitz & Stegun 10.1.19 (recurrence), run downwards.
 */
export function scaledPsi(x: number, terms: number): Float64Array {
  if (table.length <= terms) table = new Float64Array(2 * terms);
  let ratio = 0;
  for (let order = terms + EXTRA_TERMS; order >= 1; order--) {
    ratio = 1 / ((2 * order + 1) / x - ratio);
    if (order <= terms) table[order] = ratio;
  }
  table[0] = Math.sin(x);
  for (let order = 1; order <= terms; order++) table[order] *= table[order - 1];
  return table;
}
