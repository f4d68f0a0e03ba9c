import type { RunSummary } from '@/entities/run-summary';
import type { RunHistogram } from '@/src/runs/schema';
import { rangeAround, type RadiusRangeUm } from './plots/radius-range';

/** The population, the ends of all windows and the peaks of beta: what must be in view when nothing is zoomed. */
export function radiiOfInterest({ perMaterial }: RunSummary, histogram?: RunHistogram): RadiusRangeUm {
  const ends = perMaterial.flatMap(({ unboundIntervalsUm, radiusAtBetaMaxUm }) => [
    ...unboundIntervalsUm.flat(),
    radiusAtBetaMaxUm,
  ]);
  const edges = histogram ? [histogram.edgesUm[0], histogram.edgesUm[histogram.edgesUm.length - 1]] : [];
  return rangeAround([...ends, ...edges].filter((radius): radius is number => radius !== null && radius !== undefined));
}
