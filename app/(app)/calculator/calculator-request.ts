import type { CurveRequest } from '@/src/runs/request-schema';
import { curveRequest } from '@/src/runs/request-schema';
import { criticalBetaOfDraft } from '@/src/ui/run-critical-beta';
import { sayIssue } from '@/src/ui/run-issue';
import { typedNumber } from '@/src/ui/run-number';
import { starOf, type FieldProblems } from '@/src/ui/run-request-of-draft';

/** The calculator as it is typed; kept in the address. */
export type CalculatorText = {
  material: string;
  star: string;
  massSun: string;
  luminositySun: string;
  teffK: string;
  density: string;
  threshold: 'beta' | 'eccentricity';
  betaCritical: string;
  eccentricity: string;
  porosity: string;
};

export type CalculatorReading = { request: CurveRequest; problems: null } | { request: null; problems: FieldProblems };

const unread = 'Write a number such as 0.5 or 2e-3.';

/** Reads what was typed. A release at the pericentre of the given eccentricity may stand for the critical beta. */
export function requestOfCalculator(text: CalculatorText): CalculatorReading {
  const problems: Record<string, string> = {};
  const numberAt = (pointer: string, typed: string) => {
    const value = typedNumber(typed);
    if (value === undefined) problems[pointer] = unread;
    if (value === null) problems[pointer] = 'Give a number.';
    return value ?? undefined;
  };
  const optionalAt = (pointer: string, typed: string) => (typed.trim() === '' ? undefined : numberAt(pointer, typed));
  const porosity = optionalAt('optics.porosity', text.porosity);
  const asked = {
    slug: text.material,
    ...starOf(text, numberAt),
    densityGCm3: optionalAt('densityGCm3', text.density),
    betaCritical:
      text.threshold === 'beta' ? numberAt('betaCritical', text.betaCritical) : criticalOf(text.eccentricity, problems),
    optics: { model: 'mie', ...(porosity ? { porosity } : {}) },
  };
  const parsed = curveRequest.safeParse(asked);
  for (const issue of parsed.error?.issues ?? []) problems[issue.path.join('.')] ??= sayIssue(issue);
  return parsed.success && Object.keys(problems).length === 0
    ? { request: parsed.data, problems: null }
    : { request: null, problems };
}

function criticalOf(eccentricity: string, problems: Record<string, string>): number | undefined {
  const critical = criticalBetaOfDraft({ eccentricity, at: 'pericentre', trueAnomalyDeg: '', parentBeta: '' });
  if (critical === null) problems.eccentricity = 'Give an eccentricity from 0 to below 1.';
  return critical ?? undefined;
}
