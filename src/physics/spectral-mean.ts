import type { GrainSampler } from './grain-sampler';
import type { SpectralGrid } from './spectral-grid';

/** How far the wavelength doubling goes for one radius. Levels count doublings of 32 intervals. */
export interface DoublingRule {
  firstLevel: number;
  lastLevel: number;
  relativeTolerance: number;
}

/** Spectral means of one radius; `relativeError` estimates the error of qPr, `settled` says whether the rule was met. */
export interface SpectralMean {
  qPr: number;
  qAbs: number;
  relativeError: number;
  settled: boolean;
}

/**
 * Energy mean of Q_pr and Q_abs of a grain by nested doubling of the wavelength nodes. It stops after two decreasing
 * differences (last below the tolerance, the one before below eight times it): a single small difference was seen to
 * deceive by 2e-3 where Mie ripples are under-sampled.
 */
export function spectralMean(
  sampler: GrainSampler,
  grid: SpectralGrid,
  radiusM: number,
  rule: DoublingRule,
): SpectralMean {
  const finest = grid.weights.length - 1;
  const count = grid.wavelengthM.length;
  const pressure = new Float64Array(count);
  const absorption = new Float64Array(count);
  const pair = new Float64Array(2);
  const means: number[] = [];
  let qPr = 0;
  let qAbs = 0;
  for (let level = 0; level <= rule.lastLevel; level++) {
    const stride = 1 << (finest - level);
    for (let node = level === 0 ? 0 : stride; node < count; node += level === 0 ? stride : 2 * stride) {
      sampler.sample(pair, radiusM, node);
      pressure[node] = pair[0];
      absorption[node] = pair[1];
    }
    const weights = grid.weights[level];
    qPr = 0;
    qAbs = 0;
    for (let index = 0; index < weights.length; index++) {
      qPr += weights[index] * pressure[index * stride];
      qAbs += weights[index] * absorption[index * stride];
    }
    means.push(qPr);
    if (level >= rule.firstLevel && settled(means, rule.relativeTolerance)) break;
  }
  const last = difference(means, 1);
  return { qPr, qAbs, relativeError: last, settled: settled(means, rule.relativeTolerance) };
}

/** Relative change of the mean, `back` doublings ago. */
function difference(means: number[], back: number): number {
  const at = means.length - back;
  return at < 1 ? Infinity : Math.abs(means[at] - means[at - 1]) / Math.abs(means[means.length - 1]);
}

function settled(means: number[], tolerance: number): boolean {
  return (
    difference(means, 1) < 0.7 * tolerance &&
    difference(means, 2) < 8 * tolerance &&
    difference(means, 3) < 100 * tolerance
  );
}
