import { C2 } from './constants';

const PLANCK_NORM = 15 / Math.PI ** 4;

/**
 * Fraction of a black body's exitance at wavelengths below `wavelengthM` (m), temperature in K; absolute error 1e-10.
 * Source: Chang & Rhee (1984), Int. Comm. Heat Mass Transfer 11, 451 (series in exp(-u)); for u < 1 the complement by
 * the Bernoulli series of u^3/(e^u - 1).
 */
export function planckFractionBelow(wavelengthM: number, temperatureK: number): number {
  const u = C2 / (wavelengthM * temperatureK);
  return u < 1 ? 1 - longwardShare(u) : shortwardShare(u);
}

function shortwardShare(u: number): number {
  let sum = 0;
  for (let order = 1; order <= 60; order++) {
    const inverse = 1 / order;
    sum += Math.exp(-order * u) * inverse * (u ** 3 + inverse * (3 * u * u + inverse * (6 * u + 6 * inverse)));
  }
  return PLANCK_NORM * sum;
}

function longwardShare(u: number): number {
  const square = u * u;
  const even = 1 / 60 + square * (-1 / 5040 + square * (1 / 272160 + square * (-1 / 13305600 + square / 622702080)));
  return PLANCK_NORM * u ** 3 * (1 / 3 - u / 8 + square * even);
}
