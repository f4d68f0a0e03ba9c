import type { EntityManager } from '@mikro-orm/postgresql';

/** Some grains of a catalogue as columns; NaN where an error was not given. */
export type GrainChunk = {
  length: number;
  ordinal: Int32Array;
  radiusM: Float64Array;
  radiusSigmaM: Float64Array;
  densityKgM3: Float64Array;
  densitySigmaKgM3: Float64Array;
  count: Float64Array;
  material: string[];
};

type Row = {
  ordinal: number;
  radius_m: number;
  radius_sigma_m: number | null;
  density_kg_m3: number;
  density_sigma_kg_m3: number | null;
  count: number;
  material: string;
};

const chunkRows = 4096;

/** All grains of a catalogue in order, some thousands at a time, so that memory stays flat. */
export async function* grainChunks(em: EntityManager, catalogueId: string): AsyncGenerator<GrainChunk> {
  let after = -1;
  while (true) {
    const rows = await em.getConnection().execute<Row[]>(
      `select ordinal, radius_m, radius_sigma_m, density_kg_m3, density_sigma_kg_m3, count, material
       from grain where catalogue_id = ? and ordinal > ? order by ordinal limit ?`,
      [catalogueId, after, chunkRows],
    );
    if (rows.length === 0) return;
    yield chunkOf(rows);
    after = rows[rows.length - 1].ordinal;
  }
}

export function chunkOf(rows: Row[]): GrainChunk {
  const column = (pick: (row: Row) => number | null) => Float64Array.from(rows, (row) => pick(row) ?? NaN);
  return {
    length: rows.length,
    ordinal: Int32Array.from(rows, (row) => row.ordinal),
    radiusM: column((row) => row.radius_m),
    radiusSigmaM: column((row) => row.radius_sigma_m),
    densityKgM3: column((row) => row.density_kg_m3),
    densitySigmaKgM3: column((row) => row.density_sigma_kg_m3),
    count: column((row) => row.count),
    material: rows.map((row) => row.material),
  };
}
