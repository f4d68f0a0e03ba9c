/** Radii of a curve: 1 nm to 1 cm in equal steps of ln radius. */
export const CURVE_RADIUS_MIN_M = 1e-9;
export const CURVE_RADIUS_MAX_M = 1e-2;
export const CURVE_INTERVALS = 640;
export const LN_RADIUS_MIN = Math.log(CURVE_RADIUS_MIN_M);
export const LN_RADIUS_STEP = Math.log(CURVE_RADIUS_MAX_M / CURVE_RADIUS_MIN_M) / CURVE_INTERVALS;

/** Spectral means at one radius of the grid. */
export interface CurveNode {
  index: number;
  qPr: number;
  qAbs: number;
}

/** Q_abs of a lossless material has no logarithm; this stands for zero. */
const LEAST_Q = 1e-300;

/** Logarithm of an efficiency, as curves store it. */
export function lnQ(q: number): number {
  return Math.log(Math.max(q, LEAST_Q));
}

/** Radius in m of a grid index. */
export function radiusOfIndex(index: number): number {
  return Math.exp(LN_RADIUS_MIN + index * LN_RADIUS_STEP);
}

/** Nearest grid index of a radius (m) that is a multiple of `step`, inside the grid. */
export function indexOfRadius(radiusM: number, step: number): number {
  const index = Math.round((Math.log(radiusM) - LN_RADIUS_MIN) / LN_RADIUS_STEP / step) * step;
  return Math.min(CURVE_INTERVALS, Math.max(0, index));
}
