/** [real, imaginary]. */
export type Complex = readonly [number, number];

export const add = (a: Complex, b: Complex): Complex => [a[0] + b[0], a[1] + b[1]];
export const subtract = (a: Complex, b: Complex): Complex => [a[0] - b[0], a[1] - b[1]];
export const scale = (a: Complex, factor: number): Complex => [a[0] * factor, a[1] * factor];
export const multiply = (a: Complex, b: Complex): Complex => [a[0] * b[0] - a[1] * b[1], a[0] * b[1] + a[1] * b[0]];

export function divide(a: Complex, b: Complex): Complex {
  const reciprocal = 1 / (b[0] * b[0] + b[1] * b[1]);
  return [(a[0] * b[0] + a[1] * b[1]) * reciprocal, (a[1] * b[0] - a[0] * b[1]) * reciprocal];
}

/** The root with a real part that is not negative. */
export function squareRoot([re, im]: Complex): Complex {
  const modulus = Math.hypot(re, im);
  if (modulus === 0) return [0, 0];
  if (re >= 0) {
    const root = Math.sqrt(0.5 * (modulus + re));
    return [root, im / (2 * root)];
  }
  const root = Math.sqrt(0.5 * (modulus - re));
  return im >= 0 ? [im / (2 * root), root] : [-im / (2 * root), -root];
}

export const modulusOf = (a: Complex): number => Math.hypot(a[0], a[1]);
