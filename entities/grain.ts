import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { Catalogue } from './catalogue';
import { real } from './columns';

/** Written by COPY and read in pages: see src/catalogues. All quantities in SI. */
export const Grain = defineEntity({
  name: 'Grain',
  tableName: 'grain',
  properties: {
    catalogue: () => p.manyToOne(Catalogue).primary().deleteRule('cascade'),
    ordinal: p.integer().primary(),
    line: p.integer(),
    label: p.text().nullable(),
    radiusM: real(),
    radiusSigmaM: real().nullable(),
    densityKgM3: real(),
    densitySigmaKgM3: real().nullable(),
    material: p.text(),
    count: real(),
  },
  checks: [
    { name: 'grain_radius_positive', expression: "radius_m > 0 and radius_m < 'infinity'" },
    { name: 'grain_density_positive', expression: "density_kg_m3 > 0 and density_kg_m3 < 'infinity'" },
    {
      name: 'grain_sigmas_not_negative',
      expression: 'coalesce(radius_sigma_m, 0) >= 0 and coalesce(density_sigma_kg_m3, 0) >= 0',
    },
    { name: 'grain_count_positive', expression: "count > 0 and count < 'infinity'" },
  ],
});
export type Grain = InferEntity<typeof Grain>;
