import { AU, C, G_NEWTON, GM_SUN, L_SUN, YEAR_S } from './constants';

/**
 * Integral over the decay of an eccentric orbit, 2F1(3/10, 1; 9/5; e^2), by its series for e^2 <= 1/2 and by the
 * connection formula to 1 - e^2 above (Abramowitz & Stegun 15.3.6). Relative error below 1e-12 for 0 <= e < 1.
 */
function decayFactor(eccentricity: number): number {
  const z = eccentricity * eccentricity;
  if (z <= 0.5) return hypergeometric(0.3, 1, 1.8, z);
  const w = (1 - eccentricity) * (1 + eccentricity);
  // c - a - b = 1/2; Gamma(9/5) Gamma(1/2)/(Gamma(3/2) Gamma(4/5)) = 2 * 4/5 = 8/5.
  const regular = 1.6 * hypergeometric(0.3, 1, 0.5, w);
  // Gamma(9/5) Gamma(-1/2)/(Gamma(3/10) Gamma(1)) (1-z)^(1/2) 2F1(3/2, 4/5; 3/2; w), the last factor being (1-w)^(-4/5).
  const singular = (GAMMA_9_5 * -2 * Math.sqrt(Math.PI)) / GAMMA_3_10;
  return regular + singular * Math.sqrt(w) * z ** -0.8;
}

/** Gamma(9/5) and Gamma(3/10) (NIST DLMF 5.4, evaluated to 17 digits). */
const GAMMA_9_5 = 0.931_383_770_980_242_7;
const GAMMA_3_10 = 2.991_568_987_687_590_6;

function hypergeometric(a: number, b: number, c: number, z: number): number {
  let term = 1;
  let sum = 1;
  for (let n = 0; n < 400 && Math.abs(term) > 1e-17 * Math.abs(sum); n++) {
    term *= (((a + n) * (b + n)) / ((c + n) * (n + 1))) * z;
    sum += term;
  }
  return sum;
}

/**
 * Poynting-Robertson time (yr) from an orbit (a in au, e) down to the star: a^2/(4 alpha) (1-e^2)^(3/2) 2F1(3/10, 1; 9/5; e^2),
 * alpha = beta GM/c. Elements are the osculating ones in the weakened gravity. Range: 0 <= e < 1, beta > 0; speeds well below
 * light. Relative error below 1e-12 of the formula. Source: Wyatt & Whipple (1950), ApJ 111, 134.
 */
export function prTimeYr({
  semiMajorAxisAu,
  eccentricity,
  beta,
  massSun,
}: {
  semiMajorAxisAu: number;
  eccentricity: number;
  beta: number;
  massSun: number;
}): number {
  const alpha = (beta * massSun * GM_SUN) / C;
  const circularYr = (semiMajorAxisAu * AU) ** 2 / (4 * alpha) / YEAR_S;
  const complement = (1 - eccentricity) * (1 + eccentricity);
  return circularYr * complement ** 1.5 * decayFactor(eccentricity);
}

/**
 * Poynting-Robertson time (yr) between two circular orbits (au): (r0^2 - r1^2)/(4 alpha). Exact closed form. Source: Burns,
 * Lamy & Soter (1979), Icarus 40, 1, eq. 50.
 */
export function prTimeCircularYr({
  fromAu,
  toAu = 0,
  beta,
  massSun,
}: {
  fromAu: number;
  toAu?: number;
  beta: number;
  massSun: number;
}): number {
  const alpha = (beta * massSun * GM_SUN) / C;
  return ((fromAu - toAu) * (fromAu + toAu) * AU * AU) / (4 * alpha) / YEAR_S;
}

/** Mass loss of the wind (solar masses per Julian year), speed (km/s), momentum-transfer efficiency. */
export interface Wind {
  massLossSunPerYr: number;
  speedKmS: number;
  qsw: number;
}

export interface WindFactors {
  /** Pressure of the wind over that of light, both radial. */
  pressureRatio: number;
  /** Drag of the wind over that of light: divide Poynting-Robertson times by 1 + this. */
  dragRatio: number;
}

/**
 * A radial stellar wind beside starlight, for grains much slower than the wind: pressure (Q_sw/Q_pr) Mdot v c/L and drag
 * (Q_sw/Q_pr) Mdot c^2/L. The mass loss in kg carries the uncertainty of G, 2e-5. Order-of-magnitude physics: Q_sw is
 * uncertain by tens of per cent. Source: Burns, Lamy & Soter (1979), section IV; Gustafson (1994), Annu. Rev. Earth Planet. Sci. 22, 553.
 */
export function windFactors({
  massLossSunPerYr,
  speedKmS,
  qsw,
  qpr,
  luminositySun,
}: Wind & { qpr: number; luminositySun: number }): WindFactors {
  const massLossKgS = (massLossSunPerYr * GM_SUN) / G_NEWTON / YEAR_S;
  const perSpeed = ((qsw / qpr) * massLossKgS * C) / (luminositySun * L_SUN);
  return { pressureRatio: perSpeed * speedKmS * 1000, dragRatio: perSpeed * C };
}
