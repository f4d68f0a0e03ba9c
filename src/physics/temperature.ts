import { AU, L_SUN, SIGMA_SB } from './constants';
import { splineSlopes } from './cubic-spline';
import { qabsAt, type Curve } from './curve';
import type { Emission } from './emission';
import { hermite } from './hermite';
import { CURVE_INTERVALS } from './radius-grid';

export { buildEmission, type Emission } from './emission';

/** Flux of the star at this distance (au), spread over the grain's whole surface, in units of T^4: K^4. */
function balance(luminositySun: number, distanceAu: number): number {
  return (luminositySun * L_SUN) / (16 * Math.PI * (distanceAu * AU) ** 2 * SIGMA_SB);
}

/**
 * Equilibrium temperature (K) of a black sphere at a distance (au): 278.330 L^(1/4) r^(-1/2). Fast rotator or conductor,
 * point source, no other light. Exact closed form.
 */
export function blackBodyTemperatureK(luminositySun: number, distanceAu: number): number {
  return balance(luminositySun, distanceAu) ** 0.25;
}

/**
 * Equilibrium temperature (K) of grains as a function of the radius (m): <Q_abs>_star L/(16 pi r^2 sigma) = <Q_abs>(T) T^4 at a
 * distance (au). Range 2.7 to 6000 K, NaN outside; solids melt and sublimate long before. Error 0.2 % of the model, 0.4 % for metals and narrow infrared resonances; grains below
 * about 10 nm heat up photon by photon and have no single temperature. Solved on the curve's own radii, where starlight may
 * change faster than the thermal radiation, spline in between.
 * Source: energy balance, Bohren & Huffman (1983), section 4.7.
 */
export function temperatureCurve(
  curve: Curve,
  emission: Emission,
  luminositySun: number,
  distanceAu: number,
): (radiusM: number) => number {
  const { lnRadiusMin, lnRadiusStep, radii } = emission;
  const lnBalance = Math.log(balance(luminositySun, distanceAu));
  const step = ((radii - 1) * lnRadiusStep) / CURVE_INTERVALS;
  const lnRadius = Float64Array.from({ length: CURVE_INTERVALS + 1 }, (_, index) => lnRadiusMin + index * step);
  const lnT = lnRadius.map((at) => lnTemperature(emission, at, lnBalance + Math.log(qabsAt(curve, Math.exp(at)))));
  const slopes = splineSlopes(lnRadius, lnT);
  return (radiusM) => {
    const at = Math.min(lnRadius[CURVE_INTERVALS], Math.max(lnRadiusMin, Math.log(radiusM)));
    const left = Math.min(CURVE_INTERVALS - 1, Math.floor((at - lnRadiusMin) / step));
    return Math.exp(hermite(lnRadius, lnT, slopes, left, at).value);
  };
}

/** Root of ln <Q_abs>(T) + 4 ln T = wanted; cubic in ln radius over four rows of the table, linear in ln T between its columns. */
function lnTemperature(emission: Emission, lnRadius: number, wanted: number): number {
  const { lnQabs, radii, temperatures, lnTMin, lnTStep } = emission;
  const position = (lnRadius - emission.lnRadiusMin) / emission.lnRadiusStep;
  const row = Math.min(radii - 4, Math.max(0, Math.floor(position) - 1));
  const weights = cubicWeights(position - row);
  const radiated = (column: number) =>
    weights.reduce((sum, weight, offset) => sum + weight * lnQabs[(row + offset) * temperatures + column], 0) +
    4 * (lnTMin + column * lnTStep);
  let low = 0;
  let high = temperatures - 1;
  if (radiated(low) > wanted || radiated(high) < wanted) return NaN;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (radiated(middle) <= wanted) low = middle;
    else high = middle;
  }
  const share = (wanted - radiated(low)) / (radiated(high) - radiated(low));
  return lnTMin + (low + share) * lnTStep;
}

/** Lagrange weights of values at 0, 1, 2, 3. */
function cubicWeights(at: number): number[] {
  return [
    -((at - 1) * (at - 2) * (at - 3)) / 6,
    (at * (at - 2) * (at - 3)) / 2,
    -(at * (at - 1) * (at - 3)) / 2,
    (at * (at - 1) * (at - 2)) / 6,
  ];
}
