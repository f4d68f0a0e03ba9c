let dr = new Float64Array(64);
let di = new Float64Array(64);

/** Bohren & Huffman (1983), appendix A, without angles: downward D_n, upward psi and chi. The floor of the bench, not used by the product. */
export function textbookMie(out: Float64Array, x: number, n: number, k: number): void {
  const terms = Math.ceil(x + 4 * Math.cbrt(x) + 2);
  const modulus = Math.hypot(n, k) * x;
  const start = Math.ceil(Math.max(terms, modulus) + 16 + 4 * Math.cbrt(modulus));
  if (dr.length <= start) {
    dr = new Float64Array(2 * start);
    di = new Float64Array(2 * start);
  }
  const scale = 1 / (modulus * modulus);
  const [zr, zi] = [n * x * scale, -k * x * scale];
  dr[start] = di[start] = 0;
  for (let order = start; order > 1; order -= 1) {
    const [qr, qi] = [order * zr, order * zi];
    const er = dr[order] + qr;
    const ei = di[order] + qi;
    const reciprocal = 1 / (er * er + ei * ei);
    dr[order - 1] = qr - er * reciprocal;
    di[order - 1] = qi + ei * reciprocal;
  }
  const m2 = n * n + k * k;
  let [psi0, psi1, chi0, chi1] = [Math.cos(x), Math.sin(x), -Math.sin(x), Math.cos(x)];
  let [extinction, scattering, asymmetry] = [0, 0, 0];
  let [lar, lai, lbr, lbi] = [0, 0, 0, 0];
  for (let order = 1; order <= terms; order += 1) {
    const step = (2 * order - 1) / x;
    const psi = step * psi1 - psi0;
    const chi = step * chi1 - chi0;
    const tr = (dr[order] * n + di[order] * k) / m2 + order / x;
    const ti = (di[order] * n - dr[order] * k) / m2;
    const [ar, ai] = quotient(tr * psi - psi1, ti * psi, tr * psi - psi1 + ti * chi, ti * psi - tr * chi + chi1);
    const ur = dr[order] * n - di[order] * k + order / x;
    const ui = dr[order] * k + di[order] * n;
    const [br, bi] = quotient(ur * psi - psi1, ui * psi, ur * psi - psi1 + ui * chi, ui * psi - ur * chi + chi1);
    const degeneracy = 2 * order + 1;
    extinction += degeneracy * (ar + br);
    scattering += degeneracy * (ar * ar + ai * ai + br * br + bi * bi);
    asymmetry +=
      (((order - 1) * (order + 1)) / order) * (lar * ar + lai * ai + lbr * br + lbi * bi) +
      (degeneracy / (order * (order + 1))) * (ar * br + ai * bi);
    [lar, lai, lbr, lbi] = [ar, ai, br, bi];
    [psi0, psi1, chi0, chi1] = [psi1, psi, chi1, chi];
  }
  out[0] = (2 / (x * x)) * extinction;
  out[1] = (2 / (x * x)) * scattering;
  out[3] = ((4 / (x * x)) * asymmetry) / out[1];
}

function quotient(ar: number, ai: number, br: number, bi: number): [number, number] {
  const reciprocal = 1 / (br * br + bi * bi);
  return [(ar * br + ai * bi) * reciprocal, (ai * br - ar * bi) * reciprocal];
}
