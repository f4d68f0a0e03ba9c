import type { EntityManager } from '@mikro-orm/postgresql';
import { once } from 'node:events';
import { finished } from 'node:stream/promises';
import { from as copyFrom } from 'pg-copy-streams';
import { transactionClient } from '@/src/queue';
import { BinaryRows } from './binary-rows';

export type Copy = { rows: BinaryRows; drain(): Promise<void> };

/**
 * A COPY inside the open transaction: it rolls back with it, and the connection is usable again when the work fails.
 * `table` and `columns` are our own words, never input.
 */
export async function copyInto<T>(
  tx: EntityManager,
  table: string,
  columns: readonly string[],
  work: (copy: Copy) => Promise<T>,
): Promise<T> {
  const client = await transactionClient(tx);
  const names = columns.map((column) => `"${column}"`).join(', ');
  const stream = client.query(copyFrom(`copy "${table}" (${names}) from stdin with (format binary)`));
  const done = finished(stream);
  // The rejection is awaited below; without this an early failure would end the process first.
  done.catch(() => undefined);
  const rows = new BinaryRows();
  const drain = async () => {
    if (!stream.write(rows.take())) await Promise.race([once(stream, 'drain'), done]);
  };
  try {
    const outcome = await work({ rows, drain });
    stream.end(rows.end());
    await done;
    return outcome;
  } catch (error) {
    const closed = stream.closed ? undefined : once(stream, 'close');
    stream.on('error', () => undefined);
    stream.destroy(error instanceof Error ? error : undefined);
    await closed?.catch(() => undefined);
    throw error;
  }
}
