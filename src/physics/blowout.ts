import { brentRoot, goldenMaximum } from './brent';
import { CURVE_INTERVALS, CURVE_RADIUS_MAX_M, CURVE_RADIUS_MIN_M } from './radius-grid';

/** Radii for which grains are unbound, and how far beta reaches. */
export interface UnboundSet {
  /** Radii [lo, hi] in m with beta >= betaCritical, ascending; lo = 0 or hi = Infinity where the set is open. */
  intervalsM: [number, number][];
  betaMax: number;
  radiusAtBetaMaxM: number;
  /** The set reaches the smallest radius examined. */
  extendsBelow: boolean;
  /** The set reaches the largest radius examined. */
  extendsAbove: boolean;
}

export interface SearchRange {
  minRadiusM?: number;
  maxRadiusM?: number;
  intervals?: number;
}

const LN_TOLERANCE = 1e-10;
/** Golden section resolves an extremum only to the square root of the rounding. */
const LN_EXTREMUM_TOLERANCE = 1e-8;
const TANGENT_TOLERANCE = 1e-12;

/**
 * All radii (m) for which a grain is unbound, beta(radius) >= betaCritical (equality counts; a curve that only touches the
 * threshold gives an interval of zero width; none gives []). Beta is sampled evenly in ln radius, 1 nm to 1 cm in 640 steps
 * by default; extrema between the samples are refined first, so that narrow windows are not missed; ends are found by Brent in ln radius to 1e-10.
 */
export function unboundIntervals(
  betaAt: (radiusM: number) => number,
  betaCritical: number,
  { minRadiusM = CURVE_RADIUS_MIN_M, maxRadiusM = CURVE_RADIUS_MAX_M, intervals = CURVE_INTERVALS }: SearchRange = {},
): UnboundSet {
  const beta = (lnRadius: number) => betaAt(Math.exp(lnRadius));
  const points = withExtrema(beta, Math.log(minRadiusM), Math.log(maxRadiusM), intervals);
  const peak = points.reduce((best, point) => (point.beta > best.beta ? point : best));
  const isUnbound = (value: number) => value >= betaCritical * (1 - TANGENT_TOLERANCE);

  const intervalsM: [number, number][] = [];
  let start: number | null = isUnbound(points[0].beta) ? 0 : null;
  for (let index = 1; index < points.length; index++) {
    const before = points[index - 1];
    const here = points[index];
    if (isUnbound(before.beta) === isUnbound(here.beta)) continue;
    const crossing = crossingRadius(beta, betaCritical, before, here);
    if (start === null) start = crossing;
    else {
      intervalsM.push([start, crossing]);
      start = null;
    }
  }
  if (start !== null) intervalsM.push([start, Infinity]);
  return {
    intervalsM,
    betaMax: peak.beta,
    radiusAtBetaMaxM: Math.exp(peak.lnRadius),
    extendsBelow: isUnbound(points[0].beta),
    extendsAbove: isUnbound(points[points.length - 1].beta),
  };
}

interface Sample {
  lnRadius: number;
  beta: number;
}

/** Even samples with the maximum or minimum of every local bend put in between. */
function withExtrema(beta: (lnRadius: number) => number, low: number, high: number, intervals: number): Sample[] {
  const at = (lnRadius: number): Sample => ({ lnRadius, beta: beta(lnRadius) });
  const even = Array.from({ length: intervals + 1 }, (_, index) => at(low + ((high - low) * index) / intervals));
  const extrema: Sample[] = [];
  for (let index = 1; index < intervals; index++) {
    const rise = even[index].beta - even[index - 1].beta;
    const fall = even[index].beta - even[index + 1].beta;
    if (rise * fall <= 0) continue;
    const sign = rise > 0 ? 1 : -1;
    const signed = (lnRadius: number) => sign * beta(lnRadius);
    extrema.push(at(goldenMaximum(signed, even[index - 1].lnRadius, even[index + 1].lnRadius, LN_EXTREMUM_TOLERANCE)));
  }
  return [...even, ...extrema].sort((a, b) => a.lnRadius - b.lnRadius);
}

/** Radius where beta passes the threshold between two samples; a touching extremum is its own crossing. */
function crossingRadius(
  beta: (lnRadius: number) => number,
  betaCritical: number,
  before: Sample,
  here: Sample,
): number {
  const excess = (lnRadius: number) => beta(lnRadius) - betaCritical;
  const touching = [before, here].find((sample) => Math.abs(sample.beta / betaCritical - 1) <= TANGENT_TOLERANCE);
  if (touching !== undefined) return Math.exp(touching.lnRadius);
  return Math.exp(brentRoot(excess, before.lnRadius, here.lnRadius, LN_TOLERANCE));
}
