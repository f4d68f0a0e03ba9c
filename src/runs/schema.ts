import { z } from 'zod';
import { runStatuses } from '@/entities/run';

const finite = z.number();

/** [lo, hi] in um; lo is 0 when the interval reaches down to the smallest radius, hi null when it has no upper end. */
export const unboundInterval = z.tuple([finite, finite.nullable()]);

export const materialSummary = z.object({
  material: z.string(),
  name: z.string(),
  grains: finite,
  meanDensityGCm3: finite,
  betaMax: finite,
  radiusAtBetaMaxUm: finite,
  unboundIntervalsUm: z.array(unboundInterval),
  geometricBlowoutRadiusUm: finite,
  curveKey: z.string().nullable(),
  relativeErrorBound: finite,
  shareOutsideValidRange: finite,
  unboundNumberShare: finite,
});
export type MaterialSummaryItem = z.infer<typeof materialSummary>;

export const runSummary = z.object({
  grains: z.number().int(),
  counted: finite.describe('Sum of the count column'),
  betaCritical: finite,
  unbound: z.object({
    rows: z.number().int(),
    number: finite,
    numberShare: finite,
    areaShare: finite,
    massShare: finite,
    expectedNumberShare: finite,
    interval95: z.tuple([finite, finite]),
    repelled: finite.describe('Grains with beta of 1 or more, by count'),
  }),
  geometric: z.object({ numberShare: finite, areaShare: finite, massShare: finite }),
  perMaterial: z.array(materialSummary),
  warnings: z.array(z.string()),
});

export const runItem = z.object({
  id: z.uuid(),
  name: z.string(),
  status: z.enum(runStatuses),
  progress: finite.describe('0 to 1'),
  stage: z.string().describe('What is being done, in words'),
  error: z.string().nullable(),
  inputs: z.record(z.string(), z.unknown()).describe('Every input, frozen by value when the run was requested'),
  summary: runSummary.nullable(),
  engineVersion: z.string(),
  resultSha256: z.string().nullable().describe('SHA-256 over the result columns'),
  requestedBy: z.string(),
  createdAt: z.iso.datetime(),
  startedAt: z.iso.datetime().nullable(),
  finishedAt: z.iso.datetime().nullable(),
});
export type RunItem = z.infer<typeof runItem>;

export const regimes = ['unbound', 'drag', 'collisions'] as const;

export const runGrainItem = z.object({
  ordinal: z.number().int(),
  label: z.string().nullable(),
  radiusUm: finite,
  densityGCm3: finite,
  material: z.string(),
  count: finite,
  qpr: finite,
  beta: finite,
  pUnbound: finite,
  fate: z.enum(['unbound', 'bound']),
  regime: z.enum(regimes),
  prTimeYr: finite.nullable(),
  collisionTimeYr: finite.nullable(),
  semiMajorAxisAu: finite.nullable(),
  eccentricity: finite.nullable(),
  vInfKmS: finite.nullable(),
  temperatureK: finite.nullable(),
  lorentzRatio: finite.nullable(),
});
export type RunGrainItem = z.infer<typeof runGrainItem>;

export const histogramBy = ['number', 'area', 'mass'] as const;

export const runHistogram = z.object({
  by: z.enum(histogramBy),
  unit: z.string().describe('Of the weights'),
  edgesUm: z.array(finite).describe('One more than there are bins'),
  unbound: z.array(finite),
  bound: z.array(finite),
});
export type RunHistogram = z.infer<typeof runHistogram>;

export const curveAnswer = z.object({
  radiiUm: z.array(finite),
  qpr: z.array(finite),
  beta: z.array(finite),
  relativeErrorBound: finite,
  shareOutsideValidRange: finite,
  betaCritical: finite,
  betaMax: finite,
  radiusAtBetaMaxUm: finite,
  unboundIntervalsUm: z.array(unboundInterval),
  geometricBlowoutRadiusUm: finite,
  densityGCm3: finite,
  notes: z.array(z.string()),
});
export type CurveAnswer = z.infer<typeof curveAnswer>;

/** The curves of a finished run, one per material, on a common grid of radii. */
export const runCurves = z.object({
  betaCritical: finite,
  curves: z.array(
    z.object({
      material: z.string(),
      name: z.string(),
      densityGCm3: finite,
      radiiUm: z.array(finite),
      qpr: z.array(finite),
      beta: z.array(finite),
    }),
  ),
});
export type RunCurves = z.infer<typeof runCurves>;
