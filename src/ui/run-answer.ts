import type { MaterialSummary, RunSummary } from '@/entities/run-summary';
import { exactText, percentInterval, percentText, radiusText, trimmed } from './run-figures';

/** Text with the numbers that matter marked, so that the page can set them apart. */
export type AnswerPart = string | { figure: string; isMinor?: boolean };

export type RunAnswer = {
  headline: AnswerPart[];
  materials: { material: string; text: string; geometric: string }[];
  comparison: string;
  notes: string[];
};

type Interval = readonly [number, number | null];

/** The answer of a finished run in words. `star` as it reads after "of": "the Sun". */
export function runAnswer(summary: RunSummary, star: string): RunAnswer {
  return {
    headline: headline(summary, star),
    materials: summary.perMaterial.map((material) => ({
      material: material.material,
      text: materialSentence(material),
      geometric: `With Q_pr = 1: below ${radiusText(material.geometricBlowoutRadiusUm)}.`,
    })),
    comparison: comparison(summary),
    notes: notes(summary),
  };
}

function headline({ unbound }: RunSummary, star: string): AnswerPart[] {
  const interval = { figure: percentInterval(unbound.interval95), isMinor: true };
  if (unbound.rows === 0) {
    return [`Starlight of ${star} unbinds `, { figure: 'none' }, ' of the grains (95\u00a0% interval ', interval, ').'];
  }
  return [
    `Starlight of ${star} unbinds `,
    { figure: percentText(unbound.numberShare) },
    ' of the grains (95\u00a0% interval ',
    interval,
    '), ',
    { figure: percentText(unbound.areaShare) },
    ' of their cross-section and ',
    { figure: percentText(unbound.massShare) },
    ' of their mass.',
  ];
}

/** "Water ice: never; beta peaks at 0.431 at 0.210 µm." or "Amorphous carbon below 1.21 µm." */
export function materialSentence(
  material: Pick<MaterialSummary, 'name' | 'unboundIntervalsUm' | 'betaMax' | 'radiusAtBetaMaxUm'>,
): string {
  const { name, unboundIntervalsUm, betaMax, radiusAtBetaMaxUm } = material;
  if (unboundIntervalsUm.length === 0) {
    return `${name}: never; beta peaks at ${trimmed(betaMax)} at ${radiusText(radiusAtBetaMaxUm)}.`;
  }
  return `${name} ${intervalsInWords(unboundIntervalsUm)}.`;
}

export function intervalsInWords(intervals: readonly Interval[]): string {
  const words = intervals.map(intervalInWords);
  const last = words.pop() ?? 'never';
  return words.length ? `${words.join(', ')} and ${last}` : last;
}

function intervalInWords([lowUm, highUm]: Interval): string {
  if (lowUm === 0) return highUm === null ? 'at every radius' : `below ${radiusText(highUm)}`;
  if (highUm === null) return `above ${radiusText(lowUm)}`;
  if (lowUm === highUm) return `at ${radiusText(lowUm)} only`;
  return `between ${trimmed(lowUm)} and ${radiusText(highUm)}`;
}

function comparison({ geometric }: RunSummary): string {
  const [number, area, mass] = [geometric.numberShare, geometric.areaShare, geometric.massShare].map(percentText);
  return `For comparison, grains that take exactly the light that falls on them (Q_pr = 1) would lose ${number} by number, ${area} by cross-section and ${mass} by mass.`;
}

const tellingDifference = 5e-4;

function notes({ unbound, perMaterial, betaCritical }: RunSummary): string[] {
  const told = [
    `Unbound means beta of ${exactText(betaCritical)} or more, the critical value of this release.`,
    `The radii hold for the mean density of each material (${perMaterial.map(densityOf).join('; ')}); each grain is judged at its own density.`,
  ];
  if (Math.abs(unbound.expectedNumberShare - unbound.numberShare) > tellingDifference) {
    told.push(
      `With the quoted errors of size and density the expected share by number is ${percentText(unbound.expectedNumberShare)}.`,
    );
  }
  if (unbound.repelled > 0) {
    told.push(
      `${grainCount(unbound.repelled)} with beta of 1 or more: light outweighs gravity and pushes such grains away on any path.`,
    );
  }
  return told;
}

const densityOf = ({ name, meanDensityGCm3 }: MaterialSummary) => `${name} ${trimmed(meanDensityGCm3)} g/cm³`;

const grainCount = (count: number) =>
  `${count.toLocaleString('en-US', { maximumFractionDigits: 1 })} grain${count === 1 ? '' : 's'}`;
