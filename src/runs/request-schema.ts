import { z } from 'zod';
import { starNumbers } from '@/src/stars/schema';

const slugOrAlias = z.string().min(1).max(64);

export const releaseInput = z
  .strictObject({
    distanceAu: z.number().positive().max(1e6).describe('Distance from the star at release, au'),
    eccentricity: z.number().min(0).lt(1).describe("Eccentricity of the parent's orbit"),
    at: z.enum(['pericentre', 'apocentre', 'anomaly']),
    trueAnomalyDeg: z.number().min(-360).max(360).optional().describe('Needed when at is anomaly, degrees'),
    parentBeta: z.number().min(0).lt(1).optional().describe('Beta of the parent body, 0 when left out'),
  })
  .refine((release) => release.at !== 'anomaly' || release.trueAnomalyDeg !== undefined, {
    path: ['trueAnomalyDeg'],
    message: 'is needed when the release is at a true anomaly',
  });

export const opticsInput = z
  .strictObject({
    model: z.enum(['mie', 'constant']),
    qpr: z
      .number()
      .positive()
      .max(10)
      .optional()
      .describe('Radiation-pressure efficiency; needed when the model is constant'),
    porosity: z
      .union([z.number().min(0).max(0.99), z.literal('fromDensity')])
      .optional()
      .describe('Share of vacuum in the grain, or fromDensity: 1 - bulk density / material density of each grain'),
    mixing: z
      .enum(['bruggeman', 'maxwellGarnett'])
      .optional()
      .describe('Mixing rule for porous grains, bruggeman when left out'),
    mantle: z
      .strictObject({ material: slugOrAlias, volumeFraction: z.number().gt(0).lt(1) })
      .optional()
      .describe('A coating: its material and its share of the volume'),
  })
  .superRefine((optics, context) => {
    const issue = (path: string, message: string) => context.addIssue({ code: 'custom', path: [path], message });
    if (optics.model === 'constant') {
      if (optics.qpr === undefined) issue('qpr', 'is needed when the model is constant');
      for (const unused of ['porosity', 'mixing', 'mantle'] as const) {
        if (optics[unused] !== undefined) issue(unused, 'has no effect when the model is constant: leave it out');
      }
    } else if (optics.qpr !== undefined) issue('qpr', 'has no effect when the model is mie: leave it out');
    if (optics.mixing !== undefined && optics.porosity === undefined) issue('mixing', 'needs a porosity');
    if (optics.mantle && optics.porosity !== undefined) issue('mantle', 'cannot be combined with a porosity');
  });

export const windInput = z.strictObject({
  massLossSunPerYr: z.number().positive().max(1e-3).describe('Mass loss of the star, solar masses per year'),
  speedKmS: z.number().positive().max(10_000).describe('Speed of the wind, km/s'),
  qsw: z.number().positive().max(10).optional().describe('Momentum-transfer efficiency of the wind, 1 when left out'),
});

export const discInput = z.strictObject({
  opticalDepth: z.number().positive().max(1).describe('Face-on optical depth of the disc at the release distance'),
});

export const chargingInput = z.strictObject({
  potentialV: z.number().min(-100).max(100).describe('Surface potential of the grains, V'),
  fieldNT: z.number().positive().max(1e6).describe('Azimuthal magnetic field at the release distance, nT'),
});

const exactlyOneStar = (value: { starId?: unknown; starSlug?: unknown; star?: unknown }) =>
  [value.starId, value.starSlug, value.star].filter((given) => given !== undefined).length === 1;

export const runRequest = z
  .strictObject({
    catalogueId: z.uuid(),
    name: z.string().trim().min(1).max(200).optional(),
    starId: z.uuid().optional(),
    starSlug: slugOrAlias.optional(),
    star: starNumbers.optional(),
    release: releaseInput,
    optics: opticsInput,
    wind: windInput.optional(),
    disc: discInput.optional(),
    charging: chargingInput.optional(),
  })
  .refine(exactlyOneStar, { path: ['starSlug'], message: 'give exactly one of starId, starSlug and star' });
export type RunRequest = z.infer<typeof runRequest>;

export const curveRequest = z
  .strictObject({
    materialId: z.uuid().optional(),
    slug: slugOrAlias.optional().describe('Slug or alias of the material'),
    starId: z.uuid().optional(),
    starSlug: slugOrAlias.optional(),
    star: starNumbers.optional(),
    densityGCm3: z.number().positive().max(25).optional().describe("The material's own when left out"),
    betaCritical: z.number().positive().max(10).optional().describe('0.5 when left out'),
    optics: opticsInput.optional(),
    radiiUm: z
      .array(z.number().min(1e-3).max(1e4))
      .min(1)
      .max(2000)
      .optional()
      .describe('A grid of the whole range when left out'),
  })
  .refine(exactlyOneStar, { path: ['starSlug'], message: 'give exactly one of starId, starSlug and star' })
  .refine((value) => (value.materialId === undefined) !== (value.slug === undefined), {
    path: ['slug'],
    message: 'give exactly one of materialId and slug',
  });
export type CurveRequest = z.infer<typeof curveRequest>;
