import type { RunInputs } from '@/entities/run-inputs';
import type { RunSummary } from '@/entities/run-summary';
import { intervalsInWords } from './run-answer';
import { percentText, trimmed } from './run-figures';

const tellingShareOutside = 0.01;
const chargedBelowUm = 0.1;
const transparentErrorBound = 5e-4;
const bulkOpticsBelowUm = 0.005;

/** The cautions that this very run calls for, most serious first. */
export function runCautions(summary: RunSummary, inputs: RunInputs, smallestRadiusUm: number | null): string[] {
  return [
    ...summary.warnings,
    ...outsideMeasurements(summary),
    ...chargedGrains(summary, inputs, smallestRadiusUm),
    ...tinyGrains(smallestRadiusUm),
    ...transparent(summary),
    ...always(inputs),
  ];
}

function outsideMeasurements({ perMaterial }: RunSummary): string[] {
  return perMaterial
    .filter(({ shareOutsideValidRange }) => shareOutsideValidRange > tellingShareOutside)
    .map(
      ({ name, shareOutsideValidRange }) =>
        `${percentText(shareOutsideValidRange)} of the starlight lies outside the wavelengths at which the optical constants of ${name} were measured: its beta rests on an extrapolation there.`,
    );
}

function chargedGrains(
  { perMaterial }: RunSummary,
  { charging }: RunInputs,
  smallestRadiusUm: number | null,
): string[] {
  const hasSmall = smallestRadiusUm === null || smallestRadiusUm < chargedBelowUm;
  if (!hasSmall) return [];
  const windows = perMaterial.filter(({ unboundIntervalsUm }) =>
    unboundIntervalsUm.some(([low]) => low > 0 && low < chargedBelowUm),
  );
  const lowerEnds = windows
    .map(({ name, unboundIntervalsUm }) => `${name} ${intervalsInWords(unboundIntervalsUm)}`)
    .join('; ');
  const about = lowerEnds ? ` This bears on the lower ends of the windows (${lowerEnds}).` : '';
  const seen = charging
    ? 'The column "Lorentz / gravity" says how strong the force is for each grain.'
    : 'Turn on charging to see how strong the force is.';
  return [
    `Grains below about 0.1 µm are charged, and near a star like the Sun the magnetic force rules their motion: their fate from beta alone is only indicative.${about} ${seen}`,
  ];
}

function tinyGrains(smallestRadiusUm: number | null): string[] {
  if (smallestRadiusUm === null || smallestRadiusUm >= bulkOpticsBelowUm) return [];
  return [
    `The smallest grain has a radius of ${trimmed(smallestRadiusUm * 1000)} nm. Below 5 nm optical constants of bulk matter no longer describe a grain.`,
  ];
}

function transparent({ perMaterial }: RunSummary): string[] {
  const weak = perMaterial.filter(({ relativeErrorBound }) => relativeErrorBound >= transparentErrorBound);
  if (weak.length === 0) return [];
  const named = weak.map(({ name, relativeErrorBound }) => `${name} (${percentText(relativeErrorBound)})`).join(', ');
  return [`Nearly transparent matter has sharp resonances, so the error bound of beta is wider for ${named}.`];
}

function always({ star, optics }: RunInputs): string[] {
  const spectrum = star.spectrum === null && optics.model === 'mie' ? ' The star shines as a black body.' : '';
  return [
    `Grains are uniform spheres, or the stated mixture, released at rest relative to their parent, in optically thin surroundings without gas.${spectrum} Real irregular grains can differ in beta by tens of per cent.`,
  ];
}
