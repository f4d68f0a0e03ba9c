import type { EntityManager } from '@mikro-orm/postgresql';

/** What a catalogue holds of one material; the mean density is weighted with the mass. */
export type MaterialPopulation = {
  material: string;
  rows: number;
  meanDensityKgM3: number;
  leastDensityKgM3: number;
  greatestDensityKgM3: number;
  leastRadiusM: number;
};

type Row = { material: string; rows: number; mean: number; least: number; greatest: number; least_radius: number };

export async function materialPopulations(em: EntityManager, catalogueId: string): Promise<MaterialPopulation[]> {
  const found = await em.getConnection().execute<Row[]>(
    `select material, count(*)::int as rows, sum(count * radius_m ^ 3 * density_kg_m3 ^ 2) / sum(count * radius_m ^ 3 * density_kg_m3) as mean,
       min(density_kg_m3) as least, max(density_kg_m3) as greatest, min(radius_m) as least_radius
     from grain where catalogue_id = ? group by material order by count(*) desc, material`,
    [catalogueId],
  );
  return found.map((row) => ({
    material: row.material,
    rows: row.rows,
    meanDensityKgM3: row.mean,
    leastDensityKgM3: row.least,
    greatestDensityKgM3: row.greatest,
    leastRadiusM: row.least_radius,
  }));
}

/** The densities (kg/m3) that occur, or null when there are more than `most`. */
export async function fewDensities(
  em: EntityManager,
  catalogueId: string,
  material: string,
  most: number,
): Promise<number[] | null> {
  const found = await em
    .getConnection()
    .execute<{ density: number }[]>(
      `select distinct density_kg_m3 as density from grain where catalogue_id = ? and material = ? order by density limit ?`,
      [catalogueId, material, most + 1],
    );
  return found.length > most ? null : found.map(({ density }) => density);
}
