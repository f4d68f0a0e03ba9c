import type { EntityManager } from '@mikro-orm/postgresql';
import type { Actor } from '@/src/access/actor';
import { sortedRows } from '@/src/access/keyset';
import { ownCatalogue } from './find-catalogues';
import { grainConditions } from './grain-conditions';
import { catalogueGrainSorts, type CatalogueGrainQuery } from './grain-query';
import type { CatalogueGrainItem } from './schema';
import { gramsPerCm3, micrometres } from './shown-units';

type Row = {
  ordinal: number;
  line: number;
  label: string | null;
  radius_m: number;
  radius_sigma_m: number | null;
  density_kg_m3: number;
  density_sigma_kg_m3: number | null;
  material: string;
  count: number;
};

export async function findCatalogueGrains(em: EntityManager, actor: Actor, id: string, query: CatalogueGrainQuery) {
  const catalogue = await ownCatalogue(em, actor, id);
  const { sort, order, limit, after, offset } = query;
  return sortedRows(
    em,
    {
      from: 'grain g',
      select: 'g.*',
      conditions: [{ sql: 'g.catalogue_id = ?', values: [catalogue.id] }, ...grainConditions(query)],
      sortBy: catalogueGrainSorts[sort],
      ordinal: 'g.ordinal',
      order,
      limit,
      after,
      offset,
    },
    (row) => grainItemOf(row as unknown as Row),
  );
}

const grainItemOf = (row: Row): CatalogueGrainItem => ({
  ordinal: row.ordinal,
  line: row.line,
  label: row.label,
  radiusUm: micrometres(row.radius_m),
  radiusSigmaUm: row.radius_sigma_m === null ? null : micrometres(row.radius_sigma_m),
  densityGCm3: gramsPerCm3(row.density_kg_m3),
  densitySigmaGCm3: row.density_sigma_kg_m3 === null ? null : gramsPerCm3(row.density_sigma_kg_m3),
  material: row.material,
  count: row.count,
});
