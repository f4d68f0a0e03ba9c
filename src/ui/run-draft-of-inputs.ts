import type { RunInputs } from '@/entities/run-inputs';
import { emptyDraft, ownStar, type RunDraft } from './run-draft';

/** The form filled in as an earlier run was asked for. */
export function draftOfInputs(inputs: RunInputs, name: string): RunDraft {
  const { star, release, optics, wind, disc, charging } = inputs;
  return {
    ...emptyDraft,
    name: `${name} (changed)`.slice(0, 200),
    catalogueId: inputs.catalogue.id,
    star: star.slug ?? ownStar,
    massSun: String(star.massSun),
    luminositySun: String(star.luminositySun),
    teffK: String(star.teffK),
    distanceAu: String(release.distanceAu),
    eccentricity: String(release.eccentricity),
    at: release.at,
    trueAnomalyDeg: textOf(release.trueAnomalyDeg),
    parentBeta: release.parentBeta ? String(release.parentBeta) : '',
    model: optics.model,
    qpr: String(optics.qpr ?? emptyDraft.qpr),
    ...structureOf(optics),
    ...(wind && {
      hasWind: true,
      massLossSunPerYr: String(wind.massLossSunPerYr),
      windSpeedKmS: String(wind.speedKmS),
      qsw: String(wind.qsw),
    }),
    ...(disc && { hasDisc: true, opticalDepth: String(disc.opticalDepth) }),
    ...(charging && { hasCharging: true, potentialV: String(charging.potentialV), fieldNT: String(charging.fieldNT) }),
  };
}

const textOf = (value: number | undefined) => (value === undefined ? '' : String(value));

function structureOf({ porosity, mixing, mantle }: RunInputs['optics']): Partial<RunDraft> {
  const how = mixing ? { mixing } : {};
  if (mantle)
    return { structure: 'coated', mantleMaterial: mantle.material, mantleFraction: String(mantle.volumeFraction) };
  if (porosity === 'fromDensity') return { structure: 'fromDensity', ...how };
  return porosity ? { structure: 'porous', porosity: String(porosity), ...how } : {};
}
