/** Rounding in beta and in the critical value together stays far below this. */
const ROUNDING = 1e-12;

/**
 * Whether a grain of this beta leaves: beta >= betaCritical, equality counts (a parabola). Values that differ by less than
 * 1e-12 relative are equal. Source: definition; see criticalBeta.
 */
export function isUnbound(beta: number, betaCritical: number): boolean {
  return beta >= betaCritical * (1 - ROUNDING);
}

/** Whether light outweighs gravity altogether, beta >= 1: the path curves away from the star. */
export function isRepelled(beta: number): boolean {
  return beta >= 1 - ROUNDING;
}

export type Regime = 'unbound' | 'drag' | 'collisions';

/**
 * The process that ends a grain's stay first: blow-out acts within about one orbit and so wins whenever it acts; otherwise the
 * shorter of drag and collision time (yr; null where it does not exist). Without a disc it is drag.
 */
export function regimeOf({
  isUnbound: unbound,
  dragTimeYr,
  collisionTimeYr,
}: {
  isUnbound: boolean;
  dragTimeYr: number | null;
  collisionTimeYr: number | null;
}): Regime {
  if (unbound) return 'unbound';
  if (collisionTimeYr === null) return 'drag';
  return dragTimeYr === null || collisionTimeYr < dragTimeYr ? 'collisions' : 'drag';
}
