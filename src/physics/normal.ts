import jStat from 'jstat';

/** Standard normal distribution function. Absolute error below 1e-14 (jstat's erfc; compared with tables in the tests). */
export function normalCdf(z: number): number {
  return 0.5 * jStat.erfc(-z * Math.SQRT1_2);
}

const DENSITY_AT_0 = 1 / Math.sqrt(2 * Math.PI);

/** Standard normal density. */
export const normalDensity = (z: number): number => DENSITY_AT_0 * Math.exp(-0.5 * z * z);
