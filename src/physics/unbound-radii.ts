import { brentRoot, goldenMaximum } from './brent';
import { CURVE_INTERVALS, CURVE_RADIUS_MAX_M, CURVE_RADIUS_MIN_M } from './radius-grid';

const LN_TOLERANCE = 1e-9;
const LN_EXTREMUM_TOLERANCE = 1e-6;
/** Beyond the grid the threshold density falls as 1/radius; no grain is larger than this. */
const LN_RADIUS_LIMIT = Math.log(1e6);

/** Where ln f crosses a level: an interval [lo, hi] of ln radius per window, open ends as infinities. */
export type LnWindows = [number, number][];

/**
 * Prepares the windows {ln s : g(ln s) >= level} of one function for many levels. g is sampled evenly over the radii of the
 * curves (1 nm to 1 cm) with its bends put in between; crossings are found by Brent to 1e-9 in ln s.
 */
export function preparedWindows(g: (lnRadius: number) => number): (level: number) => LnWindows {
  const low = Math.log(CURVE_RADIUS_MIN_M);
  const high = Math.log(CURVE_RADIUS_MAX_M);
  const points = withBends(g, low, high);
  return (level) => {
    const windows: LnWindows = [];
    let start = points[0].value >= level ? -Infinity : null;
    for (let index = 1; index < points.length; index++) {
      const [before, here] = [points[index - 1], points[index]];
      if (before.value >= level === here.value >= level) continue;
      const crossing = brentRoot((lnRadius) => g(lnRadius) - level, before.at, here.at, LN_TOLERANCE);
      if (start === null) start = crossing;
      else {
        windows.push([start, crossing]);
        start = null;
      }
    }
    if (start !== null) windows.push([start, endBeyond(g, level, high)]);
    return windows;
  };
}

interface Point {
  at: number;
  value: number;
}

function withBends(g: (lnRadius: number) => number, low: number, high: number): Point[] {
  const point = (at: number): Point => ({ at, value: g(at) });
  const even = Array.from({ length: CURVE_INTERVALS + 1 }, (_, index) =>
    point(low + ((high - low) * index) / CURVE_INTERVALS),
  );
  const bends: Point[] = [];
  for (let index = 1; index < CURVE_INTERVALS; index++) {
    const rise = even[index].value - even[index - 1].value;
    const fall = even[index].value - even[index + 1].value;
    if (rise * fall <= 0) continue;
    const sign = Math.sign(rise);
    bends.push(
      point(goldenMaximum((at) => sign * g(at), even[index - 1].at, even[index + 1].at, LN_EXTREMUM_TOLERANCE)),
    );
  }
  return [...even, ...bends].sort((a, b) => a.at - b.at);
}

function endBeyond(g: (lnRadius: number) => number, level: number, from: number): number {
  for (let at = from; at < LN_RADIUS_LIMIT; at += 1) {
    if (g(at + 1) < level) return brentRoot((lnRadius) => g(lnRadius) - level, at, at + 1, LN_TOLERANCE);
  }
  return Infinity;
}
