/**
 * Sums of the Mie series with every function recurred upwards in one loop: no arrays and one reciprocal per coefficient.
 * Fills out[1] with S (2n+1)(|a|^2+|b|^2), out[2] with S (2n+1)(Re a - |a|^2 + Re b - |b|^2), out[3] with the asymmetry
 * sum. Valid where psi_n(mx) may run upwards (real part of m at least 1.2, weak absorption).
 *
 * With u_n = psi_n(mx) up to a common factor, a_n = (T psi_n - M psi_{n-1}) / (T xi_n - M xi_{n-1}) where
 * T = u_{n-1} + n (m - 1/m)/x u_n, M = m u_n, and b_n the same with T = m u_{n-1}, M = u_n. The Wronskian
 * psi_n chi_{n-1} - psi_{n-1} chi_n = -1 makes Re a - |a|^2 = -Im(T conj M) / |denominator|^2 exactly.
 */
export function mergedSeries(out: Float64Array, x: number, n: number, k: number, terms: number): void {
  const inverseX = 1 / x;
  const modulus2 = n * n + k * k;
  const inverseMr = n / modulus2;
  const inverseMi = -k / modulus2;
  const inverseZr = inverseMr * inverseX;
  const inverseZi = inverseMi * inverseX;
  const contrastR = (n - inverseMr) * inverseX;
  const contrastI = (k - inverseMi) * inverseX;

  // sin(mx) and cos(mx) divided by exp(Im mx): the common factor cancels and would overflow.
  const phase = n * x;
  const decay = Math.exp(-2 * k * x);
  const even = 0.5 * (1 + decay);
  const odd = 0.5 * (1 - decay);
  const sine = Math.sin(phase);
  const cosine = Math.cos(phase);
  let u0r = cosine * even;
  let u0i = -sine * odd;
  let u1r = sine * even;
  let u1i = cosine * odd;

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
    const psi = step * psi1 - psi0;
    const chi = step * chi1 - chi0;
    const stepR = odd2 * inverseZr;
    const stepI = odd2 * inverseZi;
    const ur = stepR * u1r - stepI * u1i - u0r;
    const ui = stepR * u1i + stepI * u1r - u0i;

    const cr = order * contrastR;
    const ci = order * contrastI;
    let tr = u1r + cr * ur - ci * ui;
    let ti = u1i + cr * ui + ci * ur;
    let mr = n * ur - k * ui;
    let mi = n * ui + k * ur;
    let pr = tr * psi - mr * psi1;
    let pi = ti * psi - mi * psi1;
    let denominatorR = pr + ti * chi - mi * chi1;
    let denominatorI = pi - tr * chi + mr * chi1;
    let reciprocal = 1 / (denominatorR * denominatorR + denominatorI * denominatorI);
    const ar = (pr * denominatorR + pi * denominatorI) * reciprocal;
    const ai = (pi * denominatorR - pr * denominatorI) * reciprocal;
    let squares = (pr * pr + pi * pi) * reciprocal;
    let losses = (tr * mi - ti * mr) * reciprocal;

    tr = n * u1r - k * u1i;
    ti = n * u1i + k * u1r;
    mr = ur;
    mi = ui;
    pr = tr * psi - mr * psi1;
    pi = ti * psi - mi * psi1;
    denominatorR = pr + ti * chi - mi * chi1;
    denominatorI = pi - tr * chi + mr * chi1;
    reciprocal = 1 / (denominatorR * denominatorR + denominatorI * denominatorI);
    const br = (pr * denominatorR + pi * denominatorI) * reciprocal;
    const bi = (pi * denominatorR - pr * denominatorI) * reciprocal;
    squares += (pr * pr + pi * pi) * reciprocal;
    losses += (tr * mi - ti * mr) * reciprocal;

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
    u0r = u1r;
    u0i = u1i;
    u1r = ur;
    u1i = ui;
  }
  out[1] = scattering;
  out[2] = absorption;
  out[3] = asymmetry;
}
