import { adaptiveIntegral } from './adaptive-integral';
import { betaOf, type ForceSource } from './beta';
import { normalCdf, normalDensity } from './normal';
import { preparedWindows, type LnWindows } from './unbound-radii';

/** Standard deviation of ln s for a radius s with one-sigma error, both m, s being the median. Exact. Source: lognormal moments. */
export function lnSigmaOf(radiusM: number, radiusSigmaM: number): number {
  return Math.sqrt(Math.log1p((radiusSigmaM / radiusM) ** 2));
}

/** Standard deviation of ln s from a multiplicative one-sigma error factor on the mass (m ~ s^3). Exact. */
export const lnSigmaOfMassFactor = (factor: number): number => Math.log(factor) / 3;

export type Probability = (
  radiusM: number,
  radiusSigmaM: number,
  densityKgM3: number,
  densitySigmaKgM3: number,
) => number;

/** Beyond so many standard deviations nothing is left that counts (6e-16). */
const REACH = 8;
const TOLERANCE = 1e-6;
const WIDEST_PANEL_LN = 0.25;
const FEWEST_PANELS = 4;

/**
 * Prepares P(unbound) of single grains in one light: radius lognormal around its value as the median, density normal and cut
 * off at 0, both independent; without errors 1 or 0 (equality counts as unbound). <Q_pr> must depend on the radius (m) alone.
 *
 * Grains of density rho leave at the radii where rho <= f(s) = K Q(s)/(beta_c s). Without a density error the result is a sum
 * of normal-CDF differences over those windows; with one it is the integral over ln s of the density's distribution function at f(s), by
 * adaptive Gauss-Kronrod. Absolute error below 1e-5 (compared with a dense two-dimensional sum in the tests). Source: definition.
 */
export function prepareProbability(
  qprAt: (radiusM: number) => number,
  { massSun, luminositySun, betaCritical }: ForceSource & { betaCritical: number },
): Probability {
  const thresholdTimesRadius = betaOf({ qpr: 1, radiusM: 1, densityKgM3: 1, massSun, luminositySun }) / betaCritical;
  const lnThreshold = (lnRadius: number) => Math.log(thresholdTimesRadius * qprAt(Math.exp(lnRadius))) - lnRadius;
  let windowsAt: ((lnDensity: number) => LnWindows) | undefined;
  return (radiusM, radiusSigmaM, densityKgM3, densitySigmaKgM3) => {
    const lnRadius = Math.log(radiusM);
    const densityBelow = densityDistribution(densityKgM3, densitySigmaKgM3);
    if (radiusSigmaM === 0) return densityBelow(Math.exp(lnThreshold(lnRadius)));
    const lnSigma = lnSigmaOf(radiusM, radiusSigmaM);
    windowsAt ??= preparedWindows(lnThreshold);
    if (densitySigmaKgM3 === 0) {
      return windowsAt(Math.log(densityKgM3)).reduce(
        (sum, [lo, hi]) => sum + normalCdf((hi - lnRadius) / lnSigma) - normalCdf((lo - lnRadius) / lnSigma),
        0,
      );
    }
    const integrand = (z: number) => normalDensity(z) * densityBelow(Math.exp(lnThreshold(lnRadius + lnSigma * z)));
    const crossings = windowsAt(Math.log(densityKgM3)).flat();
    return overPanels(
      integrand,
      lnSigma,
      crossings.map((at) => (at - lnRadius) / lnSigma),
    );
  };
}

/**
 * Panels are narrow in ln s, so that narrow windows do not fall between the nodes, and end where grains of the given density
 * change their fate: with a small density error that is a step, which a panel with no node beyond it would miss.
 */
function overPanels(integrand: (z: number) => number, lnSigma: number, steps: number[]): number {
  const panels = Math.max(FEWEST_PANELS, Math.ceil((2 * REACH * lnSigma) / WIDEST_PANEL_LN));
  const even = Array.from({ length: panels + 1 }, (_, panel) => -REACH + (2 * REACH * panel) / panels);
  const edges = [...even, ...steps.filter((z) => Math.abs(z) < REACH)].sort((a, b) => a - b);
  let sum = 0;
  for (let index = 1; index < edges.length; index++) {
    sum += adaptiveIntegral(integrand, edges[index - 1], edges[index], TOLERANCE / panels);
  }
  return Math.min(1, Math.max(0, sum));
}

/** P(density <= level) of a normal density cut off at 0; a step for a density without error. */
function densityDistribution(densityKgM3: number, sigmaKgM3: number): (level: number) => number {
  if (sigmaKgM3 === 0) return (level) => (densityKgM3 <= level * (1 + 1e-12) ? 1 : 0);
  const belowZero = normalCdf(-densityKgM3 / sigmaKgM3);
  return (level) => (normalCdf((level - densityKgM3) / sigmaKgM3) - belowZero) / (1 - belowZero);
}
