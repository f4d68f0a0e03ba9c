import { brentRoot } from './brent';

/** dN/ds ~ s^-index between two sizes (any unit). */
export interface PowerLaw {
  index: number;
  min: number;
  max: number;
}

/** Size index from the index of a mass distribution n(m) ~ m^-q: 3 q - 2. Exact. Source: m ~ s^3 (Dohnanyi 1969 for 11/6 and 3.5). */
export const sizeIndexOfMassIndex = (massIndex: number): number => 3 * massIndex - 2;

/**
 * Share of a power-law population below a size, weighted with size^moment (0 number, 2 cross-section, 3 mass); sizes in any one
 * unit. Exact closed form, also where the exponent vanishes.
 */
export function powerLawShareBelow(size: number, { index, min, max }: PowerLaw, moment: number): number {
  const exponent = moment + 1 - index;
  const lnUpTo = (end: number) => Math.log(end / min);
  const integral = (end: number) =>
    Math.abs(exponent) < 1e-12 ? lnUpTo(end) : Math.expm1(exponent * lnUpTo(end)) / exponent;
  return integral(Math.min(max, Math.max(min, size))) / integral(max);
}

/**
 * Maximum-likelihood index of dN/ds ~ s^-index for sizes above `min`, or between `min` and `max` (any one unit), with its
 * standard error. Needs at least two sizes in the range that are not all equal to `min`; below about 50 the error is only indicative.
 * Source: Clauset, Shalizi & Newman (2009), SIAM Rev. 51, 661, eq. 3.1-3.2; truncated form by the same principle.
 */
export function powerLawIndex(
  sizes: readonly number[],
  min: number,
  max?: number,
): { index: number; standardError: number } {
  const inside = sizes.filter((size) => size >= min && (max === undefined || size <= max));
  const meanLn = inside.reduce((sum, size) => sum + Math.log(size / min), 0) / inside.length;
  if (!(inside.length >= 2 && meanLn > 0))
    throw new RangeError('A power law needs two sizes in its range, not all at the lower end.');
  if (max === undefined) return { index: 1 + 1 / meanLn, standardError: 1 / meanLn / Math.sqrt(inside.length) };
  const lnRange = Math.log(max / min);
  const reach = 700 / lnRange;
  const t = brentRoot((trial) => meanOf(trial, lnRange) - meanLn, -reach, reach, 1e-13);
  return { index: 1 + t, standardError: 1 / Math.sqrt(inside.length * informationOf(t, lnRange)) };
}

/** Mean of ln(s/min) of a truncated law with index 1 + t: 1/t - lnR/(R^t - 1), lnR/2 at t = 0. */
function meanOf(t: number, lnRange: number): number {
  const u = t * lnRange;
  if (Math.abs(u) < 1e-4) return lnRange * (0.5 - u / 12);
  return 1 / t - lnRange / Math.expm1(u);
}

/** Fisher information per size: 1/t^2 - ln^2 R e^-u/(1 - e^-u)^2, ln^2 R/12 at t = 0. */
function informationOf(t: number, lnRange: number): number {
  const u = Math.abs(t) * lnRange;
  if (u < 1e-3) return (lnRange * lnRange) / 12;
  return 1 / (t * t) - (lnRange * lnRange * Math.exp(-u)) / Math.expm1(-u) ** 2;
}
