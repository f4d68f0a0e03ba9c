import { gramsPerCm3, micrometres } from '@/src/catalogues/shown-units';
import { regimes, type RunGrainItem } from './schema';

/** What a run says of a grain, beside what the catalogue says of it. */
export const runGrainFrom = 'run_grain r join grain g on g.ordinal = r.ordinal';
export const runGrainSelect = 'r.*, g.label, g.radius_m, g.density_kg_m3, g.material, g.count';

export type RunGrainRow = {
  ordinal: number;
  label: string | null;
  radius_m: number;
  density_kg_m3: number;
  material: string;
  count: number;
  qpr: number;
  beta: number;
  p_unbound: number;
  is_unbound: boolean;
  regime: number;
  pr_time_yr: number | null;
  collision_time_yr: number | null;
  semi_major_axis_au: number | null;
  eccentricity: number | null;
  v_inf_km_s: number | null;
  temperature_k: number | null;
  lorentz_ratio: number | null;
};

export const runGrainItemOf = (row: RunGrainRow): RunGrainItem => ({
  ordinal: row.ordinal,
  label: row.label,
  radiusUm: micrometres(row.radius_m),
  densityGCm3: gramsPerCm3(row.density_kg_m3),
  material: row.material,
  count: row.count,
  qpr: row.qpr,
  beta: row.beta,
  pUnbound: row.p_unbound,
  fate: row.is_unbound ? 'unbound' : 'bound',
  regime: regimes[row.regime],
  prTimeYr: row.pr_time_yr,
  collisionTimeYr: row.collision_time_yr,
  semiMajorAxisAu: row.semi_major_axis_au,
  eccentricity: row.eccentricity,
  vInfKmS: row.v_inf_km_s,
  temperatureK: row.temperature_k,
  lorentzRatio: row.lorentz_ratio,
});
