/** Value and slope at `at` of the cubic Hermite polynomial on the interval [x[left], x[left + 1]]. */
export function hermite(
  x: Float64Array,
  y: Float64Array,
  slopes: Float64Array,
  left: number,
  at: number,
): { value: number; slope: number } {
  const width = x[left + 1] - x[left];
  const t = (at - x[left]) / width;
  const rise = y[left + 1] - y[left];
  const c1 = slopes[left] * width;
  const c3 = (slopes[left] + slopes[left + 1]) * width - 2 * rise;
  const c2 = rise - c1 - c3;
  return { value: y[left] + t * (c1 + t * (c2 + t * c3)), slope: (c1 + t * (2 * c2 + t * 3 * c3)) / width };
}
