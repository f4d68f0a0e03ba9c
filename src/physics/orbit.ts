import { AU, GM_SUN } from './constants';
import { isUnbound } from './fate';

export type ReleasePoint = 'pericentre' | 'apocentre' | 'anomaly';

/** Angles of release and shift are in degrees, lengths in au, speeds in km/s, mass in nominal solar masses. */
export interface Release {
  semiMajorAxisAu: number;
  eccentricity: number;
  trueAnomalyDeg: number;
  massSun: number;
  beta: number;
  /** Beta of the parent body; its orbit is Keplerian in the gravity weakened by it. */
  parentBeta?: number;
}

export interface ReleasedOrbit {
  fate: 'unbound' | 'bound';
  /** Null for an orbit that is not an ellipse. */
  semiMajorAxisAu: number | null;
  /** Null at beta = 1, where the path is a straight line. */
  eccentricity: number | null;
  pericentreAu: number | null;
  /** Turn of the pericentre's direction; null at beta = 1. */
  pericentreShiftDeg: number | null;
  /** Speed far away; null when bound. */
  vInfKmS: number | null;
}

const DEGREE = Math.PI / 180;

function cosDeg(angleDeg: number): number {
  const turn = ((angleDeg % 360) + 360) % 360;
  if (turn === 90 || turn === 270) return 0;
  return turn === 180 ? -1 : Math.cos(turn * DEGREE);
}

function sinDeg(angleDeg: number): number {
  const turn = ((angleDeg % 360) + 360) % 360;
  return turn === 180 ? 0 : Math.sin(turn * DEGREE);
}

/** True anomaly (deg) of a release point that is named. */
export function trueAnomalyDegOf({ at, trueAnomalyDeg }: { at: ReleasePoint; trueAnomalyDeg?: number }): number {
  if (at === 'pericentre') return 0;
  if (at === 'apocentre') return 180;
  if (trueAnomalyDeg === undefined) throw new RangeError('A release at an anomaly needs trueAnomalyDeg.');
  return trueAnomalyDeg;
}

/** Distance over semi-major axis, (1-e^2)/(1+e cos f), 0 <= e < 1. */
function distanceOverAxis(eccentricity: number, trueAnomalyDeg: number): number {
  const cosine = cosDeg(trueAnomalyDeg);
  if (cosine === 1) return 1 - eccentricity;
  if (cosine === -1) return 1 + eccentricity;
  return ((1 - eccentricity) * (1 + eccentricity)) / (1 + eccentricity * cosine);
}

/** Semi-major axis (any unit) of an ellipse that passes this distance (same unit) at this true anomaly. Exact. */
export function semiMajorAxisFromDistance(distance: number, eccentricity: number, trueAnomalyDeg: number): number {
  return distance / distanceOverAxis(eccentricity, trueAnomalyDeg);
}

/**
 * Smallest beta for which a grain released without relative velocity leaves: (1-e^2)/(2(1+e cos f)); with a parent of beta
 * bp on a Keplerian orbit in GM(1-bp): 1 - (1-bp)(1 - r/2a). Range: 0 <= e < 1, 0 <= bp < 1. Exact closed form. Source:
 * energy balance at release; for bp = 0 Harwit (1963), Kresak (1976) (recalled from memory).
 */
export function criticalBeta({
  eccentricity,
  at,
  trueAnomalyDeg,
  parentBeta = 0,
}: {
  eccentricity: number;
  at: ReleasePoint;
  trueAnomalyDeg?: number;
  parentBeta?: number;
}): number {
  const half = distanceOverAxis(eccentricity, trueAnomalyDegOf({ at, trueAnomalyDeg })) / 2;
  return parentBeta === 0 ? half : 1 - (1 - parentBeta) * (1 - half);
}

/** What the parent moves in, and the grain's beta as seen from there: mu' = mu_parent (1 - relative beta). */
const relativeBeta = (beta: number, parentBeta: number): number => (beta - parentBeta) / (1 - parentBeta);

/**
 * Osculating orbit after release without relative velocity, in the gravity weakened by the grain's beta (lengths au, angles
 * deg, speeds km/s). All cases: ellipse, parabola (equality counts as unbound, vInfKmS 0), hyperbola, straight line at
 * beta = 1, far branch above. With a parent's beta the same formulas hold in the parent's field. Rounding only, except
 * within 1e-12 of the threshold. Source: energy and angular momentum at release (Burns, Lamy & Soter 1979, section VI; the shift from the
 * eccentricity vector).
 */
export function orbitAfterRelease({
  semiMajorAxisAu,
  eccentricity,
  trueAnomalyDeg,
  beta,
  massSun,
  parentBeta = 0,
}: Release): ReleasedOrbit {
  const b = relativeBeta(beta, parentBeta);
  const cosine = cosDeg(trueAnomalyDeg);
  const twiceAxisOverDistance = 2 / distanceOverAxis(eccentricity, trueAnomalyDeg);
  const excess = b * twiceAxisOverDistance - 1;
  const unbound = isUnbound(beta, criticalBeta({ eccentricity, at: 'anomaly', trueAnomalyDeg, parentBeta }));
  const weakening = 1 - b;
  const isStraight = Math.abs(weakening) < 1e-15;
  const newEccentricity = isStraight
    ? null
    : Math.sqrt(Math.max(0, eccentricity ** 2 + 2 * eccentricity * b * cosine + b * b)) / Math.abs(weakening);
  const latusRectum = semiMajorAxisAu * (1 - eccentricity) * (1 + eccentricity);
  const circularSpeed2 = (massSun * GM_SUN * (1 - parentBeta)) / (semiMajorAxisAu * AU);
  return {
    fate: unbound ? 'unbound' : 'bound',
    semiMajorAxisAu: unbound ? null : (semiMajorAxisAu * weakening) / -excess,
    eccentricity: newEccentricity,
    pericentreAu:
      newEccentricity === null
        ? null
        : latusRectum / (weakening > 0 ? weakening * (1 + newEccentricity) : -weakening * (newEccentricity - 1)),
    pericentreShiftDeg: isStraight ? null : Math.atan2(b * sinDeg(trueAnomalyDeg), eccentricity + b * cosine) / DEGREE,
    vInfKmS: unbound ? Math.sqrt(Math.max(0, circularSpeed2 * excess)) / 1000 : null,
  };
}
