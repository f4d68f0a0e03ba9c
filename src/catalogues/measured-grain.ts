import { whyOutOfRange } from './allowed-range';
import type { ColumnField } from './mapping';
import { densityOfSphereKgM3, radiusOfSphereM } from './sphere';

/** What one row says, in SI; null where it says nothing. */
export type Measured = {
  radiusM: number | null;
  radiusSigmaM: number | null;
  diameterM: number | null;
  diameterSigmaM: number | null;
  massKg: number | null;
  massSigmaKg: number | null;
  densityKgM3: number | null;
  densitySigmaKgM3: number | null;
};

export type GrainNumbers = {
  radiusM: number;
  radiusSigmaM: number | null;
  densityKgM3: number;
  densitySigmaKgM3: number | null;
};

export type Contradiction = { field: ColumnField; reason: string };

/** Redundant columns of a row may differ by this much in radius before the row is refused (rounding, not blunders). */
const agreement = 0.1;

const differ = (a: number, b: number) => Math.abs(a - b) > agreement * Math.max(a, b);

/**
 * Radius and density of a grain from whichever of radius, diameter, mass and density its row gives.
 * A density that is missing comes from mass and size, and only then from the fallback.
 */
export function settleGrain(measured: Measured, fallbackDensityKgM3: number | null): GrainNumbers | Contradiction {
  const { radiusM, diameterM, massKg } = measured;
  if (radiusM !== null && diameterM !== null && differ(radiusM, diameterM / 2))
    return { field: 'diameter', reason: 'is not twice the radius of the row, within 10 %' };
  const sizeM = radiusM ?? (diameterM === null ? null : diameterM / 2);
  const sizeSigmaM =
    radiusM === null && measured.diameterSigmaM !== null ? measured.diameterSigmaM / 2 : measured.radiusSigmaM;
  if (sizeM === null) {
    if (massKg === null) return { field: 'radius', reason: 'no size: the row gives neither radius, diameter nor mass' };
    return sizedByMass(massKg, measured, fallbackDensityKgM3);
  }
  if (massKg !== null && measured.densityKgM3 === null) return weighed(massKg, measured.massSigmaKg, sizeM, sizeSigmaM);
  const densityKgM3 = measured.densityKgM3 ?? fallbackDensityKgM3;
  if (densityKgM3 === null) return noDensity;
  if (massKg !== null && differ(radiusOfSphereM(massKg, densityKgM3), sizeM))
    return {
      field: 'mass',
      reason: 'does not agree with the size and density of the row: the radii differ by more than 10 %',
    };
  return { radiusM: sizeM, radiusSigmaM: sizeSigmaM, densityKgM3, densitySigmaKgM3: measured.densitySigmaKgM3 };
}

const noDensity: Contradiction = { field: 'density', reason: 'no density, and no default density was given' };

/** s = (3 m / 4 pi rho)^(1/3); relative errors taken as independent, a missing one as zero: ds/s = sqrt((dm/m)^2 + (drho/rho)^2) / 3. */
function sizedByMass(
  massKg: number,
  measured: Measured,
  fallbackDensityKgM3: number | null,
): GrainNumbers | Contradiction {
  const densityKgM3 = measured.densityKgM3 ?? fallbackDensityKgM3;
  if (densityKgM3 === null) return noDensity;
  const densitySigmaKgM3 = measured.densityKgM3 === null ? null : measured.densitySigmaKgM3;
  const radiusM = radiusOfSphereM(massKg, densityKgM3);
  const tooLarge = whyOutOfRange('radius', radiusM);
  if (tooLarge) return { field: 'mass', reason: `gives a size that cannot be: it ${tooLarge}` };
  const sigmaIsKnown = measured.massSigmaKg !== null || densitySigmaKgM3 !== null;
  const relative = Math.hypot((measured.massSigmaKg ?? 0) / massKg, (densitySigmaKgM3 ?? 0) / densityKgM3) / 3;
  return { radiusM, radiusSigmaM: sigmaIsKnown ? relative * radiusM : null, densityKgM3, densitySigmaKgM3 };
}

/** rho = 3 m / 4 pi s^3; drho/rho = sqrt((dm/m)^2 + (3 ds/s)^2). Its correlation with the size error is not kept. */
function weighed(
  massKg: number,
  massSigmaKg: number | null,
  radiusM: number,
  radiusSigmaM: number | null,
): GrainNumbers | Contradiction {
  const densityKgM3 = densityOfSphereKgM3(massKg, radiusM);
  const impossible = whyOutOfRange('density', densityKgM3);
  if (impossible) return { field: 'mass', reason: `and size give a density that cannot be: it ${impossible}` };
  const sigmaIsKnown = massSigmaKg !== null || radiusSigmaM !== null;
  const relative = Math.hypot((massSigmaKg ?? 0) / massKg, (3 * (radiusSigmaM ?? 0)) / radiusM);
  return { radiusM, radiusSigmaM, densityKgM3, densitySigmaKgM3: sigmaIsKnown ? relative * densityKgM3 : null };
}
