import { z } from 'zod';
import { grainFilters, gridPaging } from '@/src/access/grid-query';

export const catalogueGrainSorts = {
  ordinal: 'g.ordinal',
  line: 'g.line',
  label: 'g.label',
  radiusUm: 'g.radius_m',
  radiusSigmaUm: 'g.radius_sigma_m',
  densityGCm3: 'g.density_kg_m3',
  densitySigmaGCm3: 'g.density_sigma_kg_m3',
  material: 'g.material',
  count: 'g.count',
} as const;

const names = Object.keys(catalogueGrainSorts) as (keyof typeof catalogueGrainSorts)[];

export const catalogueGrainQuery = z.object({ sort: z.enum(names).default('ordinal'), ...gridPaging, ...grainFilters });
export type CatalogueGrainQuery = z.infer<typeof catalogueGrainQuery>;
