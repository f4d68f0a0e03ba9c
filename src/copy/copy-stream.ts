import type { EntityManager } from '@mikro-orm/postgresql';
import { once } from 'node:events';
import { finished } from 'node:stream/promises';
import { from as copyFrom } from 'pg-copy-streams';
import { transactionClient } from '@/src/queue';
import { BinaryRows } from './binary-rows';

export type CopyStream = { rows: BinaryRows; drain(): Promise<void>; finish(): Promise<void> };

/** A COPY inside the open transaction: it rolls back with it. `table` and `columns` are our own words, never input. */
export async function openCopy(tx: EntityManager, table: string, columns: readonly string[]): Promise<CopyStream> {
  const client = await transactionClient(tx);
  const names = columns.map((column) => `"${column}"`).join(', ');
  const stream = client.query(copyFrom(`copy "${table}" (${names}) from stdin with (format binary)`));
  const done = finished(stream);
  // The rejection is awaited in drain() or finish(); without this an early failure would end the process first.
  done.catch(() => undefined);
  const rows = new BinaryRows();
  return {
    rows,
    async drain() {
      if (!stream.write(rows.take())) await Promise.race([once(stream, 'drain'), done]);
    },
    async finish() {
      stream.end(rows.end());
      await done;
    },
  };
}
