import type { EntityManager } from '@mikro-orm/postgresql';

export type SizeSpread = { rows: number; lnMin: number; lnMax: number; lnQuartile1: number; lnQuartile3: number };

/** Where the radii (m) of a catalogue lie, in natural logarithms. */
export async function sizeSpread(em: EntityManager, catalogueId: string): Promise<SizeSpread> {
  const [row] = await em.getConnection().execute<[{ rows: number; low: number; high: number; q1: number; q3: number }]>(
    `select count(*)::int as rows, min(radius_m) as low, max(radius_m) as high,
       percentile_cont(0.25) within group (order by radius_m) as q1, percentile_cont(0.75) within group (order by radius_m) as q3
     from grain where catalogue_id = ?`,
    [catalogueId],
  );
  const { rows, low, high, q1, q3 } = row;
  return { rows, lnMin: Math.log(low), lnMax: Math.log(high), lnQuartile1: Math.log(q1), lnQuartile3: Math.log(q3) };
}
