const STEP = 0.3;
const TERMS = 12;
const kernel = Float64Array.from({ length: 2 * TERMS + 1 }, (_, index) =>
  Math.exp(-(((2 * (index - TERMS) + 1) * STEP) ** 2)),
);
const INVERSE_SQRT_PI = 1 / Math.sqrt(Math.PI);

/**
 * Dawson's integral F(x) = exp(-x^2) times the integral of exp(t^2) from 0 to x, real x; absolute error below 3e-13 for
 * every x (measured against tabulated values).
 * Source: Rybicki (1989), Computers in Physics 3, 85 (exponentially convergent sum); beyond 50 the asymptotic series.
 */
export function dawson(x: number): number {
  const size = Math.abs(x);
  if (size > 50) return asymptotic(x);
  if (size < 0.2) return series(x);
  const centre = 2 * Math.round(size / (2 * STEP));
  const offset = size - centre * STEP;
  // exp(-(offset - m h)^2) = exp(-offset^2) exp(2 offset h m) exp(-(m h)^2), the last factor tabulated.
  const ratio = Math.exp(4 * offset * STEP);
  let factor = Math.exp(-offset * offset + 2 * offset * STEP * (1 - 2 * TERMS));
  let sum = 0;
  for (let index = 0; index <= 2 * TERMS; index++) {
    sum += (kernel[index] * factor) / (2 * (index - TERMS) + 1 + centre);
    factor *= ratio;
  }
  return Math.sign(x) * INVERSE_SQRT_PI * sum;
}

function series(x: number): number {
  const square = x * x;
  let term = x;
  let sum = x;
  for (let order = 1; order < 12; order++) {
    term *= (-2 * square) / (2 * order + 1);
    sum += term;
  }
  return sum;
}

function asymptotic(x: number): number {
  const inverse = 1 / (2 * x * x);
  return (1 + inverse * (1 + 3 * inverse * (1 + 5 * inverse))) / (2 * x);
}
