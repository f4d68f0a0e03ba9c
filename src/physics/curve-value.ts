import type { Curve } from './curve';

/**
 * <Q_pr> of a grain of this radius (m). Below the grid Q falls in proportion to the radius, as absorption by particles small against
 * the wavelength does; above it, ln Q approaches its limit as 1/radius. Error: the curve's `relativeErrorBound` on the grid.
 */
export function qprAt(curve: Curve, radiusM: number): number {
  return valueAt(curve, curve.coefficients, radiusM);
}

/** <Q_abs> of a grain of this radius (m); outside the grid as `qprAt`. */
export function qabsAt(curve: Curve, radiusM: number): number {
  return valueAt(curve, curve.absorption, radiusM);
}

/** <Q_pr> of many radii (m), written into `out` (same length; may be the same array). */
export function qprAtMany(curve: Curve, radiiM: Float64Array, out: Float64Array): void {
  for (let index = 0; index < radiiM.length; index++) out[index] = valueAt(curve, curve.coefficients, radiiM[index]);
}

function valueAt({ lnRadiusMin, lnRadiusStep }: Curve, coefficients: Float64Array, radiusM: number): number {
  const position = (Math.log(radiusM) - lnRadiusMin) / lnRadiusStep;
  const intervals = coefficients.length / 4;
  if (position < 0) return Math.exp(coefficients[0] + position * lnRadiusStep);
  const interval = Math.min(intervals - 1, Math.floor(position));
  const t = position - interval;
  const at = 4 * interval;
  const c1 = coefficients[at + 1];
  const c2 = coefficients[at + 2];
  const c3 = coefficients[at + 3];
  if (position <= intervals) return Math.exp(coefficients[at] + t * (c1 + t * (c2 + t * c3)));
  const slopePerLnRadius = (c1 + 2 * c2 + 3 * c3) / lnRadiusStep;
  const approach = -Math.expm1(-(position - intervals) * lnRadiusStep);
  return Math.exp(coefficients[at] + c1 + c2 + c3 + slopePerLnRadius * approach);
}
