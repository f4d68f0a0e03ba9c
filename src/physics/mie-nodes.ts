import type { Clarity } from './clarity';
import { splineSlopes } from './cubic-spline';
import type { GrainSampler } from './grain-sampler';
import { hermite } from './hermite';
import { LN_RADIUS_STEP, lnQ, radiusOfIndex, type CurveNode } from './radius-grid';
import type { SpectralGrid } from './spectral-grid';
import { spectralMean } from './spectral-mean';

const FIRST_STEP = 16;
const LAST_STEP = 2;
/** The error of a spline falls 16-fold when its step is halved; half of that is counted on. */
const GAIN_OF_HALVING = 8;
/** Means of clear grains keep a noise of 3e-4: more radii would only follow it. */
const INTERPOLATION_TOLERANCE = { opaque: 4e-5, hazy: 4e-5, clear: 1e-4 };
/** Absorption only leads to temperatures, which take a quarter of its error. */
const ABSORPTION_TOLERANCE = 1.5e-4;

interface Means extends CurveNode {
  relativeError: number;
}

/**
 * Mie means from the smallest radius up to `lastIndex`, on every 8th grid radius and on more where the splines of ln Q_pr or
 * ln Q_abs through the known radii miss the one in the middle. `step` is told the share of the work done before each radius.
 */
export function mieNodes(
  sampler: GrainSampler,
  grid: SpectralGrid,
  clarity: Clarity,
  lastIndex: number,
  step: (share: number) => void,
): { nodes: CurveNode[]; relativeError: number; capped: boolean } {
  const known = new Map<number, Means>();
  const costOf = (index: number) => 1 + (radiusOfIndex(index) / radiusOfIndex(lastIndex)) * 100;
  let capped = false;
  let done = 0;
  let total = 0;
  const compute = (indices: number[]) => {
    for (const index of indices) {
      step(Math.min(0.95, done / total));
      const mean = spectralMean(sampler, grid, radiusOfIndex(index), clarity.ruleAt(radiusOfIndex(index)));
      capped ||= !mean.settled;
      known.set(index, { index, qPr: mean.qPr, qAbs: mean.qAbs, relativeError: mean.relativeError });
      done += costOf(index);
    }
  };

  const base = range(0, lastIndex, FIRST_STEP);
  let active = base.slice(0, -1);
  const middles = (width: number) => active.map((left) => left + width / 2);
  total = [...base, ...middles(FIRST_STEP)].reduce((sum, index) => sum + costOf(index), 0) * 1.2;
  compute(base);
  let interpolationError = 0;
  for (let width = FIRST_STEP; width > LAST_STEP && active.length > 0; width /= 2) {
    const sorted = inOrder(known);
    const predict = splineOf(sorted, ({ qPr }) => qPr);
    const predictAbsorption = splineOf(sorted, ({ qAbs }) => qAbs);
    const fresh = middles(width);
    total = Math.max(total, done + fresh.reduce((sum, index) => sum + costOf(index), 0));
    compute(fresh);
    const next: number[] = [];
    for (const left of active) {
      const middle = known.get(left + width / 2);
      if (middle === undefined) continue;
      const expected = Math.abs(lnQ(middle.qPr) - predict(middle.index)) / GAIN_OF_HALVING;
      const noise = middle.relativeError / 2;
      const missed = Math.abs(lnQ(middle.qAbs) - predictAbsorption(middle.index)) / GAIN_OF_HALVING;
      const isRough =
        expected > Math.max(INTERPOLATION_TOLERANCE[clarity.kind], noise) || missed > ABSORPTION_TOLERANCE;
      if (isRough && width / 2 > LAST_STEP) next.push(left, left + width / 2);
      else interpolationError = Math.max(interpolationError, expected);
    }
    active = next;
  }
  const nodes = inOrder(known);
  const quadratureError = nodes.reduce((worst, node) => Math.max(worst, node.relativeError), 0);
  return { nodes, relativeError: quadratureError + interpolationError, capped };
}

function range(first: number, last: number, step: number): number[] {
  return Array.from({ length: Math.floor((last - first) / step) + 1 }, (_, index) => first + index * step);
}

function inOrder(known: Map<number, Means>): Means[] {
  return [...known.values()].sort((a, b) => a.index - b.index);
}

/** ln Q at any grid index from the spline through the nodes. */
function splineOf(nodes: CurveNode[], q: (node: CurveNode) => number): (index: number) => number {
  const x = Float64Array.from(nodes, (node) => node.index * LN_RADIUS_STEP);
  const y = Float64Array.from(nodes, (node) => lnQ(q(node)));
  const slopes = splineSlopes(x, y);
  return (index) => {
    const position = nodes.findIndex((node) => node.index > index) - 1;
    return hermite(x, y, slopes, position, index * LN_RADIUS_STEP).value;
  };
}
