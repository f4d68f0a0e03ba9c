import { z } from 'zod';
import { grainFilters, gridPaging, numericQuery } from '@/src/access/grid-query';

/** Sortable fields and the column behind each; r is run_grain, g is grain. */
export const runGrainSorts = {
  ordinal: 'r.ordinal',
  label: 'g.label',
  radiusUm: 'g.radius_m',
  densityGCm3: 'g.density_kg_m3',
  material: 'g.material',
  count: 'g.count',
  qpr: 'r.qpr',
  beta: 'r.beta',
  pUnbound: 'r.p_unbound',
  fate: 'r.is_unbound::int',
  regime: 'r.regime',
  prTimeYr: 'r.pr_time_yr',
  collisionTimeYr: 'r.collision_time_yr',
  semiMajorAxisAu: 'r.semi_major_axis_au',
  eccentricity: 'r.eccentricity',
  vInfKmS: 'r.v_inf_km_s',
  temperatureK: 'r.temperature_k',
  lorentzRatio: 'r.lorentz_ratio',
} as const;

const names = Object.keys(runGrainSorts) as (keyof typeof runGrainSorts)[];

export const grainQuery = z.object({
  sort: z.enum(names).default('ordinal'),
  ...gridPaging,
  ...grainFilters,
  fate: z.enum(['unbound', 'bound']).optional(),
  betaMin: numericQuery.optional(),
  betaMax: numericQuery.optional(),
});
export type GrainQuery = z.infer<typeof grainQuery>;
