import { AU, GM_SUN, YEAR_S } from './constants';

/** Orbital period (Julian yr) of a circular orbit at this distance (au) around this mass (solar). Exact closed form. */
export function orbitalPeriodYr(distanceAu: number, massSun: number): number {
  return (2 * Math.PI * Math.sqrt((distanceAu * AU) ** 3 / (massSun * GM_SUN))) / YEAR_S;
}

/**
 * Time between collisions (yr) in a disc of face-on optical depth tau at this distance (au): P/(4 pi tau). Order of magnitude:
 * other authors' factors differ by two to three. Source: Wyatt (2005), A&A 433, 1007; Wyatt et al. (1999), ApJ 527, 918.
 */
export function discCollisionTimeYr({
  distanceAu,
  massSun,
  opticalDepth,
}: {
  distanceAu: number;
  massSun: number;
  opticalDepth: number;
}): number {
  return orbitalPeriodYr(distanceAu, massSun) / (4 * Math.PI * opticalDepth);
}

/**
 * Cumulative flux of interplanetary grains heavier than `massG` (g) on one side of a randomly tumbling plate at 1 au,
 * m-2 yr-1. Range: 1e-18 g < m < 1 g. A model of the mean flux, quoted for reference. Source: Gruen, Zook, Fechtig & Giese (1985), Icarus 62, 244,
 * as given in ECSS-E-ST-10-04C, 10.2.4.1.
 */
export function interplanetaryFluxPerM2Yr(massG: number): number {
  const large = (2.2e3 * massG ** 0.306 + 15) ** -4.38;
  const middle = 1.3e-9 * (massG + 1e11 * massG ** 2 + 1e27 * massG ** 4) ** -0.36;
  const small = 1.3e-16 * (massG + 1e6 * massG ** 2) ** -0.85;
  return (large + middle + small) * YEAR_S;
}
