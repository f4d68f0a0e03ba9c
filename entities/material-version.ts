import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { createdAt, id, moment, real } from './columns';
import { Material } from './material';
import { Person } from './person';
import { presetStatuses } from './star-version';

/** Immutable once published, as a star's. `optics` has the shape of Optics in src/physics/materials.ts. */
export const MaterialVersion = defineEntity({
  name: 'MaterialVersion',
  tableName: 'material_version',
  properties: {
    id: id(),
    material: () => p.manyToOne(Material).deleteRule('cascade'),
    version: p.integer(),
    status: p.enum([...presetStatuses]),
    name: p.string().length(200),
    formula: p.string().length(200),
    densityKgM3: real(),
    densitySource: p.text(),
    optics: p.json().$type<object>(),
    validFromUm: real(),
    validToUm: real(),
    citation: p.text(),
    note: p.text().default(''),
    createdBy: () => p.manyToOne(Person).nullable().deleteRule('set null'),
    createdAt: createdAt(),
    publishedAt: moment().nullable(),
  },
  uniques: [{ name: 'material_version_number', properties: ['material', 'version'] }],
  checks: [
    { name: 'material_version_density', expression: 'density_kg_m3 > 0 and density_kg_m3 <= 25000' },
    { name: 'material_version_band', expression: 'valid_from_um > 0 and valid_to_um > valid_from_um' },
  ],
});
export type MaterialVersion = InferEntity<typeof MaterialVersion>;
