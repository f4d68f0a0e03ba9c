import { criticalBeta } from '@/src/physics/orbit';
import type { RunDraft } from './run-draft';
import { typedNumber } from './run-number';

/** The critical beta of the release as it is typed; null while it cannot be known. */
export function criticalBetaOfDraft(
  draft: Pick<RunDraft, 'eccentricity' | 'at' | 'trueAnomalyDeg' | 'parentBeta'>,
): number | null {
  const eccentricity = typedNumber(draft.eccentricity);
  const trueAnomalyDeg = typedNumber(draft.trueAnomalyDeg);
  const parentBeta = typedNumber(draft.parentBeta) ?? 0;
  if (typeof eccentricity !== 'number' || eccentricity < 0 || eccentricity >= 1 || parentBeta < 0 || parentBeta >= 1)
    return null;
  if (draft.at !== 'anomaly') return criticalBeta({ eccentricity, at: draft.at, parentBeta });
  return typeof trueAnomalyDeg === 'number'
    ? criticalBeta({ eccentricity, at: draft.at, trueAnomalyDeg, parentBeta })
    : null;
}
