import { runRequest, type RunRequest } from '@/src/runs/request-schema';
import { ownStar, type RunDraft } from './run-draft';
import { sayIssue } from './run-issue';
import { typedNumber } from './run-number';

export type FieldProblems = Readonly<Record<string, string>>;

export type DraftReading = { request: RunRequest; problems: null } | { request: null; problems: FieldProblems };

/** Reads the form; the problems are keyed as the server keys them, such as release.eccentricity. */
export function requestOfDraft(draft: RunDraft): DraftReading {
  const problems: Record<string, string> = {};
  const numberAt = (pointer: string, text: string) => {
    const value = typedNumber(text);
    if (value === null) problems[pointer] = 'Give a number.';
    if (value === undefined) problems[pointer] = 'Write a number such as 0.5 or 2e-3.';
    return value ?? undefined;
  };
  const optionalAt = (pointer: string, text: string) => (text.trim() === '' ? undefined : numberAt(pointer, text));
  if (draft.catalogueId === '') problems.catalogueId = 'Choose a catalogue.';
  if (draft.star === '') problems.starSlug = 'Choose a star.';
  if (draft.structure === 'coated' && draft.model === 'mie' && draft.mantleMaterial === '')
    problems['optics.mantle.material'] = 'Choose the material of the coating.';
  const asked = withoutGaps({
    catalogueId: draft.catalogueId,
    name: draft.name.trim() || undefined,
    ...starOf(draft, numberAt),
    release: {
      distanceAu: numberAt('release.distanceAu', draft.distanceAu),
      eccentricity: numberAt('release.eccentricity', draft.eccentricity),
      at: draft.at,
      trueAnomalyDeg: draft.at === 'anomaly' ? numberAt('release.trueAnomalyDeg', draft.trueAnomalyDeg) : undefined,
      parentBeta: optionalAt('release.parentBeta', draft.parentBeta),
    },
    optics: opticsOf(draft, numberAt),
    wind: draft.hasWind
      ? {
          massLossSunPerYr: numberAt('wind.massLossSunPerYr', draft.massLossSunPerYr),
          speedKmS: numberAt('wind.speedKmS', draft.windSpeedKmS),
          qsw: optionalAt('wind.qsw', draft.qsw),
        }
      : undefined,
    disc: draft.hasDisc ? { opticalDepth: numberAt('disc.opticalDepth', draft.opticalDepth) } : undefined,
    charging: draft.hasCharging
      ? {
          potentialV: numberAt('charging.potentialV', draft.potentialV),
          fieldNT: numberAt('charging.fieldNT', draft.fieldNT),
        }
      : undefined,
  });
  const parsed = runRequest.safeParse(asked);
  for (const issue of parsed.error?.issues ?? []) problems[issue.path.join('.')] ??= sayIssue(issue);
  return parsed.success && Object.keys(problems).length === 0
    ? { request: parsed.data, problems: null }
    : { request: null, problems };
}

type ReadNumber = (pointer: string, text: string) => number | undefined;

export function starOf(draft: Pick<RunDraft, 'star' | 'massSun' | 'luminositySun' | 'teffK'>, numberAt: ReadNumber) {
  if (draft.star !== ownStar) return { starSlug: draft.star || undefined };
  return {
    star: {
      massSun: numberAt('star.massSun', draft.massSun),
      luminositySun: numberAt('star.luminositySun', draft.luminositySun),
      teffK: numberAt('star.teffK', draft.teffK),
    },
  };
}

function opticsOf(draft: RunDraft, numberAt: ReadNumber) {
  if (draft.model === 'constant') return { model: draft.model, qpr: numberAt('optics.qpr', draft.qpr) };
  if (draft.structure === 'coated') {
    const volumeFraction = numberAt('optics.mantle.volumeFraction', draft.mantleFraction);
    return { model: draft.model, mantle: { material: draft.mantleMaterial, volumeFraction } };
  }
  if (draft.structure === 'fromDensity') return { model: draft.model, porosity: draft.structure, mixing: draft.mixing };
  if (draft.structure === 'porous')
    return { model: draft.model, porosity: numberAt('optics.porosity', draft.porosity), mixing: draft.mixing };
  return { model: draft.model };
}

/** What is left out is left out, not sent as nothing. */
function withoutGaps(value: unknown): unknown {
  return JSON.parse(JSON.stringify(value));
}
