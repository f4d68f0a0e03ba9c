import { createHash } from 'node:crypto';
import type { EntityManager } from '@mikro-orm/postgresql';
import { uuidBytes, type BinaryRows } from '@/src/copy/binary-rows';
import { copyInto } from '@/src/copy/copy-stream';
import type { GrainChunk } from './grain-chunk';
import { resultBytes, resultNames, type GrainResults } from './grain-results';

const columns = [
  ...['run_id', 'ordinal', 'qpr', 'beta', 'p_unbound', 'pr_time_yr', 'collision_time_yr', 'semi_major_axis_au'],
  ...['eccentricity', 'v_inf_km_s', 'temperature_k', 'lorentz_ratio', 'is_unbound', 'regime'],
];

/** Copies the results into the table as they come and says their SHA-256. */
export async function storeResults(
  tx: EntityManager,
  runId: string,
  computed: AsyncIterable<{ chunk: GrainChunk; results: GrainResults }>,
): Promise<string> {
  const id = uuidBytes(runId);
  const hash = createHash('sha256');
  await copyInto(tx, 'run_grain', columns, async ({ rows, drain }) => {
    for await (const { chunk, results } of computed) {
      hash.update(resultBytes(results));
      for (let row = 0; row < results.length; row += 1) writeRow(rows, id, chunk.ordinal[row], results, row);
      await drain();
    }
  });
  return hash.digest('hex');
}

function writeRow(rows: BinaryRows, runId: Buffer, ordinal: number, results: GrainResults, row: number): void {
  rows.row(columns.length);
  rows.uuid(runId);
  rows.int4(ordinal);
  for (const name of resultNames) rows.float8(results[name][row]);
  rows.bool(results.isUnbound[row] === 1);
  rows.int2(results.regime[row]);
}
