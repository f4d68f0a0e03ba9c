import { AU, EPS0, GM_SUN } from './constants';

/**
 * Charge per mass (C kg-1) of a sphere at this surface potential (V): 3 eps0 phi/(rho s^2), radius in m, density in kg m-3.
 * Valid without field emission, for grains small against the plasma's Debye length. Exact closed form. Source: capacitance of a sphere.
 */
export function chargePerMass({
  potentialV,
  radiusM,
  densityKgM3,
}: {
  potentialV: number;
  radiusM: number;
  densityKgM3: number;
}): number {
  return (3 * EPS0 * potentialV) / (densityKgM3 * radiusM * radiusM);
}

/** Speed of the wind that carries the field (km/s) when none is given: the slow solar wind, common practice. */
export const USUAL_WIND_SPEED_KM_S = 400;

export interface LorentzSetting {
  potentialV: number;
  /** Component of the field across the wind's direction, nT. */
  fieldNT: number;
  radiusM: number;
  densityKgM3: number;
  distanceAu: number;
  massSun: number;
  windSpeedKmS?: number;
}

/**
 * Lorentz force over gravity of a charged grain at rest in a field carried by a radial wind: (q/m) v B r^2/GM, without sign.
 * Order of magnitude: field and potential vary by factors. Above 0.1 the force matters, above 1 a fate from beta alone is not reliable.
 * Source: as tabulated for interplanetary grains by Gruen et al. (1994), Planet. Space Sci. 42 (recalled from memory), reproduced within 2 %.
 */
export function lorentzRatio({
  potentialV,
  fieldNT,
  radiusM,
  densityKgM3,
  distanceAu,
  massSun,
  windSpeedKmS = USUAL_WIND_SPEED_KM_S,
}: LorentzSetting): number {
  const perMass = Math.abs(chargePerMass({ potentialV, radiusM, densityKgM3 }));
  const acceleration = perMass * windSpeedKmS * 1000 * fieldNT * 1e-9;
  return (acceleration * (distanceAu * AU) ** 2) / (massSun * GM_SUN);
}

export type ChargeFlag = 'none' | 'important' | 'unreliable';

/** Levels of the flag: the ratio against what is left of gravity, max(|1 - beta|, 0.1). Thresholds 0.1 and 1: common practice. */
export function chargeFlag(ratio: number, beta: number): ChargeFlag {
  const relative = ratio / Math.max(Math.abs(1 - beta), 0.1);
  if (relative > 1) return 'unreliable';
  return relative > 0.1 ? 'important' : 'none';
}
