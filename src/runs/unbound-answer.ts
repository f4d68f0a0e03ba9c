import { micrometres } from '@/src/catalogues/shown-units';
import { betaOf } from '@/src/physics/beta';
import { unboundIntervals } from '@/src/physics/blowout';
import { CURVE_RADIUS_MIN_M } from '@/src/physics/radius-grid';

type Grain = { densityKgM3: number; massSun: number; luminositySun: number };

export type UnboundAnswer = {
  betaMax: number;
  radiusAtBetaMaxUm: number;
  unboundIntervalsUm: [number, number | null][];
  geometricBlowoutRadiusUm: number;
};

/** Below which radii grains of one density are unbound: all crossings of beta(s) with the critical value. */
export function unboundAnswer(
  effectiveQpr: (radiusM: number) => number,
  isConstant: boolean,
  grain: Grain,
  betaCritical: number,
): UnboundAnswer {
  const betaAt = (radiusM: number) => betaOf({ ...grain, radiusM, qpr: effectiveQpr(radiusM) });
  const geometricBlowoutRadiusUm = (betaOf({ ...grain, radiusM: 1, qpr: 1 }) / betaCritical) * 1e6;
  if (isConstant) {
    // beta falls as 1/s at all radii: one crossing, in closed form, and no largest value above the smallest radius.
    const crossingUm = (betaAt(1) / betaCritical) * 1e6;
    return {
      betaMax: betaAt(CURVE_RADIUS_MIN_M),
      radiusAtBetaMaxUm: micrometres(CURVE_RADIUS_MIN_M),
      unboundIntervalsUm: [[0, crossingUm]],
      geometricBlowoutRadiusUm,
    };
  }
  const { intervalsM, betaMax, radiusAtBetaMaxM } = unboundIntervals(betaAt, betaCritical);
  return {
    betaMax,
    radiusAtBetaMaxUm: radiusAtBetaMaxM * 1e6,
    unboundIntervalsUm: intervalsM.map(([lo, hi]) => [lo * 1e6, Number.isFinite(hi) ? hi * 1e6 : null]),
    geometricBlowoutRadiusUm,
  };
}
