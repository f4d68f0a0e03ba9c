import { C, GM_SUN, L_SUN } from './constants';

/** A star as far as forces go; nominal solar units. */
export interface ForceSource {
  massSun: number;
  luminositySun: number;
}

/** Light pressure over gravity for one m2 of perfectly absorbing cross-section per kg: L/(4 pi GM c), kg m-2. */
function arealDensityBalance({ massSun, luminositySun }: ForceSource): number {
  return (luminositySun * L_SUN) / (4 * Math.PI * massSun * GM_SUN * C);
}

/**
 * Ratio beta of radiation pressure to gravity of a sphere: 3 L <Q_pr>/(16 pi GM c rho s), radius in m, density in kg m-3,
 * mass and luminosity in nominal solar units. Independent of the distance (point source, optically thin). Exact closed form,
 * rounding only. Source: Burns, Lamy & Soter (1979), Icarus 40, 1, eq. 19.
 */
export function betaOf({
  qpr,
  radiusM,
  densityKgM3,
  massSun,
  luminositySun,
}: ForceSource & { qpr: number; radiusM: number; densityKgM3: number }): number {
  return (0.75 * qpr * arealDensityBalance({ massSun, luminositySun })) / (densityKgM3 * radiusM);
}

/**
 * Beta of any body from its cross-section towards the star per mass (m2 kg-1) and its radiation-pressure efficiency
 * (1 for a black body, 2 for a flat mirror facing the star). Source: as betaOf, with A/m in place of 3/(4 rho s).
 */
export function betaOfAreaToMass({
  qpr,
  areaToMassM2Kg,
  massSun,
  luminositySun,
}: ForceSource & { qpr: number; areaToMassM2Kg: number }): number {
  return qpr * areaToMassM2Kg * arealDensityBalance({ massSun, luminositySun });
}

/**
 * Blow-out radius in m when Q_pr does not depend on the radius: below it beta >= betaCritical. Density in kg m-3.
 * A comparison, not a result, for radii below the star's typical wavelengths. Exact closed form.
 */
export function geometricBlowoutRadiusM({
  qpr,
  densityKgM3,
  betaCritical,
  massSun,
  luminositySun,
}: ForceSource & { qpr: number; densityKgM3: number; betaCritical: number }): number {
  return betaOf({ qpr, radiusM: 1, densityKgM3, massSun, luminositySun }) / betaCritical;
}

/**
 * Radial efficiency, per area of one face, of a flat plate whose normal makes `tiltRad` with the light: fractions reflected
 * specularly and diffusely (Lambert), the rest absorbed and re-emitted equally from both faces. Range: tilt 0 to pi/2,
 * fractions 0 to 1 with sum at most 1. Standard solar-sail force model: McInnes (1999), Solar Sailing, section 2.6 (recalled from memory).
 */
export function plateEfficiency({
  tiltRad,
  specular,
  diffuse,
}: {
  tiltRad: number;
  specular: number;
  diffuse: number;
}): number {
  const cosine = Math.cos(tiltRad);
  return cosine * (1 - specular + 2 * specular * cosine * cosine + (2 / 3) * diffuse * cosine);
}

/** Areal density (kg m-2) of a flat perfect mirror facing the star for which beta = 1: L/(2 pi GM c). Exact closed form. */
export function criticalSailDensityKgM2(star: ForceSource): number {
  return 2 * arealDensityBalance(star);
}
