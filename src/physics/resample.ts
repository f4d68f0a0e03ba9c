import { splineSlopes } from './cubic-spline';
import { hermite } from './hermite';
import { CURVE_INTERVALS, lnQ } from './radius-grid';

/**
 * Cubic coefficients of ln Q on every interval of the radius grid from [index, Q] nodes that lie on it, first and last
 * included: the spline through the nodes, restricted to each interval, hence exact.
 */
export function resampledCoefficients(nodes: [number, number][]): Float64Array {
  const x = Float64Array.from(nodes, ([index]) => index);
  const y = Float64Array.from(nodes, ([, q]) => lnQ(q));
  const slopes = splineSlopes(x, y);
  const coefficients = new Float64Array(4 * CURVE_INTERVALS);
  let left = 0;
  for (let index = 0; index < CURVE_INTERVALS; index++) {
    while (left < x.length - 2 && x[left + 1] <= index) left++;
    const from = hermite(x, y, slopes, left, index);
    const to = hermite(x, y, slopes, left, index + 1);
    const rise = to.value - from.value;
    const c3 = from.slope + to.slope - 2 * rise;
    coefficients.set([from.value, from.slope, rise - from.slope - c3, c3], 4 * index);
  }
  return coefficients;
}
