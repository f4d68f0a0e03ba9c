/**
 * Slopes of the not-a-knot cubic spline through (x, y), x ascending, at least 4 points. With these slopes each interval is
 * the cubic Hermite polynomial; the curve is twice continuously differentiable. Source: de Boor (1978), chapter IV.
 */
export function splineSlopes(x: Float64Array, y: Float64Array): Float64Array {
  const last = x.length - 1;
  const lower = new Float64Array(last + 1);
  const diagonal = new Float64Array(last + 1);
  const upper = new Float64Array(last + 1);
  const slopes = new Float64Array(last + 1);
  const width = (index: number) => x[index + 1] - x[index];
  const secant = (index: number) => (y[index + 1] - y[index]) / width(index);

  for (let index = 1; index < last; index++) {
    const left = width(index - 1);
    const right = width(index);
    lower[index] = right;
    diagonal[index] = 2 * (left + right);
    upper[index] = left;
    slopes[index] = 3 * (right * secant(index - 1) + left * secant(index));
  }
  const first = width(0);
  const second = width(1);
  diagonal[0] = second;
  upper[0] = first + second;
  slopes[0] = ((first + 2 * (first + second)) * second * secant(0) + first * first * secant(1)) / (first + second);
  const ultimate = width(last - 1);
  const penultimate = width(last - 2);
  diagonal[last] = penultimate;
  lower[last] = ultimate + penultimate;
  slopes[last] =
    ((ultimate + 2 * (ultimate + penultimate)) * penultimate * secant(last - 1) +
      ultimate * ultimate * secant(last - 2)) /
    (ultimate + penultimate);

  for (let index = 1; index <= last; index++) {
    const factor = lower[index] / diagonal[index - 1];
    diagonal[index] -= factor * upper[index - 1];
    slopes[index] -= factor * slopes[index - 1];
  }
  slopes[last] /= diagonal[last];
  for (let index = last - 1; index >= 0; index--) {
    slopes[index] = (slopes[index] - upper[index] * slopes[index + 1]) / diagonal[index];
  }
  return slopes;
}
