import { once } from 'node:events';
import { finished } from 'node:stream/promises';
import pg from 'pg';
import { from as copyFrom } from 'pg-copy-streams';
import { BinaryRows } from '@/src/copy/binary-rows';
import { env } from '@/src/env';
import type { Line } from './bench';
import { median } from './timing';

const rows = 200_000;
const columns = 10;
const rounds = 3;
const value = (row: number, column: number) => (row + 1) * 1.000000123 ** column;

/** Binary COPY as the product does it beside a text COPY of the same rows, both into a temporary table with a primary key. */
export async function benchCopy(): Promise<Line[]> {
  const client = new pg.Client({ connectionString: env().DATABASE_URL });
  await client.connect();
  try {
    const names = Array.from({ length: columns }, (_, column) => `c${column} double precision`).join(', ');
    await client.query(`create temporary table bench (ordinal integer primary key, ${names})`);
    const text = Buffer.from(
      Array.from({ length: rows }, (_, row) =>
        [row, ...Array.from({ length: columns }, (_, column) => value(row, column))].join('\t'),
      ).join('\n') + '\n',
    );
    const pairs: [number, number][] = [];
    for (let round = 0; round < rounds; round += 1) {
      const binary = await timed(client, 'copy bench from stdin with (format binary)', binaryPieces());
      const floor = await timed(client, 'copy bench from stdin', [text]);
      pairs.push([binary, floor]);
    }
    return [
      {
        what: `storing ${rows.toLocaleString('en-US')} rows of ${columns} numbers`,
        value: rows / median(pairs.map(([work]) => work)),
        unit: 'rows/s',
        floor: 'text COPY of the same rows (time)',
        ratio: median(pairs.map(([work, floor]) => work / floor)),
      },
    ];
  } finally {
    await client.end();
  }
}

async function timed(client: pg.Client, copy: string, pieces: Iterable<Buffer>): Promise<number> {
  await client.query('truncate bench');
  const started = performance.now();
  const stream = client.query(copyFrom(copy));
  for (const piece of pieces) if (!stream.write(piece)) await once(stream, 'drain');
  stream.end();
  await finished(stream);
  return (performance.now() - started) / 1000;
}

function* binaryPieces(): Generator<Buffer> {
  const binary = new BinaryRows();
  for (let row = 0; row < rows; row += 1) {
    binary.row(columns + 1);
    binary.int4(row);
    for (let column = 0; column < columns; column += 1) binary.float8(value(row, column));
    if (binary.isFull) yield binary.take();
  }
  yield binary.end();
}
