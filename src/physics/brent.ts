/**
 * Root of `f` in [low, high], where its values have opposite signs or one is zero, to `tolerance` in the argument.
 * Source: Brent (1973), Algorithms for Minimization without Derivatives, chapter 4.
 */
export function brentRoot(f: (x: number) => number, low: number, high: number, tolerance: number): number {
  let a = low;
  let b = high;
  let fa = f(a);
  let fb = f(b);
  let c = a;
  let fc = fa;
  let step = b - a;
  let stepBefore = step;
  for (let iteration = 0; iteration < 200; iteration++) {
    if (Math.abs(fc) < Math.abs(fb)) {
      [a, b, c] = [b, c, b];
      [fa, fb, fc] = [fb, fc, fb];
    }
    const reach = 2 * Number.EPSILON * Math.abs(b) + 0.5 * tolerance;
    const middle = 0.5 * (c - b);
    if (Math.abs(middle) <= reach || fb === 0) return b;
    if (Math.abs(stepBefore) < reach || Math.abs(fa) <= Math.abs(fb)) {
      step = middle;
      stepBefore = middle;
    } else {
      const s = fb / fa;
      let p: number;
      let q: number;
      if (a === c) {
        p = 2 * middle * s;
        q = 1 - s;
      } else {
        const r = fb / fc;
        const t = fa / fc;
        p = s * (2 * middle * t * (t - r) - (b - a) * (r - 1));
        q = (t - 1) * (r - 1) * (s - 1);
      }
      if (p > 0) q = -q;
      else p = -p;
      if (2 * p < Math.min(3 * middle * q - Math.abs(reach * q), Math.abs(stepBefore * q))) {
        stepBefore = step;
        step = p / q;
      } else {
        step = middle;
        stepBefore = middle;
      }
    }
    a = b;
    fa = fb;
    b += Math.abs(step) > reach ? step : middle > 0 ? reach : -reach;
    fb = f(b);
    if (fb > 0 === fc > 0) {
      c = a;
      fc = fa;
      step = b - a;
      stepBefore = step;
    }
  }
  return b;
}

/**
 * Argument of the maximum of `f` in [low, high], where it has one, to `tolerance`. Source: golden-section search, Kiefer (1953), Proc. Amer.
 * Math. Soc. 4, 502.
 */
export function goldenMaximum(f: (x: number) => number, low: number, high: number, tolerance: number): number {
  const ratio = (Math.sqrt(5) - 1) / 2;
  let a = low;
  let b = high;
  let left = b - ratio * (b - a);
  let right = a + ratio * (b - a);
  let fLeft = f(left);
  let fRight = f(right);
  while (b - a > tolerance) {
    if (fLeft >= fRight) {
      [b, right, fRight] = [right, left, fLeft];
      left = b - ratio * (b - a);
      fLeft = f(left);
    } else {
      [a, left, fLeft] = [left, right, fRight];
      right = a + ratio * (b - a);
      fRight = f(right);
    }
  }
  return 0.5 * (a + b);
}
