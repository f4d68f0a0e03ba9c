import { AU, L_SUN, SIGMA_SB } from './constants';
import { splineSlopes } from './cubic-spline';
import { qabsAt, type Curve } from './curve';
import type { Emission } from './emission';
import { hermite } from './hermite';

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
 * distance (au). Range 2.7 to 6000 K, NaN outside; solids melt and sublimate long before. Error 0.2 % of the model; grains below
 * about 10 nm heat up photon by photon and have no single temperature. Solved at 12 radii per decade, spline in between.
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
  const lnRadius = Float64Array.from({ length: radii }, (_, row) => lnRadiusMin + row * lnRadiusStep);
  const lnT = lnRadius.map((at, row) =>
    lnTemperature(emission, row, lnBalance + Math.log(qabsAt(curve, Math.exp(at)))),
  );
  const slopes = splineSlopes(lnRadius, lnT);
  return (radiusM) => {
    const at = Math.min(lnRadius[radii - 1], Math.max(lnRadiusMin, Math.log(radiusM)));
    const left = Math.min(radii - 2, Math.floor((at - lnRadiusMin) / lnRadiusStep));
    return Math.exp(hermite(lnRadius, lnT, slopes, left, at).value);
  };
}

/** Root of ln <Q_abs>(T) + 4 ln T = wanted on one row of the table; linear in ln T between its columns. */
function lnTemperature({ lnQabs, temperatures, lnTMin, lnTStep }: Emission, row: number, wanted: number): number {
  const radiated = (column: number) => lnQabs[row * temperatures + column] + 4 * (lnTMin + column * lnTStep);
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
