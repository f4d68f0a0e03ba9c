import type { ColumnPlan, Warning } from './column-plan';
import { detectDelimiter, sampleLength } from './detect-delimiter';
import type { GrainRow } from './grain-row';
import type { ReadOptions } from './read-options';
import { RecordBlocks, type RecordBlock } from './record-blocks';
import type { RejectRow } from './reject-row';
import { RowReader } from './row-reader';
import { textPieces } from './text-pieces';

export { CatalogueFault } from './catalogue-fault';
export type { ColumnPlan, GrainRow, ReadOptions, RejectRow, Warning };

export type CatalogueSink = {
  grain(row: GrainRow): void | Promise<void>;
  reject(row: RejectRow): void | Promise<void>;
};

export type CatalogueReading = {
  accepted: number;
  rejected: number;
  blank: number;
  columns: ColumnPlan;
  warnings: Warning[];
  delimiter: string;
};

/**
 * Reads a whole catalogue with flat memory: a promise from the sink is awaited before the next row is read.
 * The parser gets blocks of whole records rather than a stream, which keeps line numbers exact and lets the same code run in
 * the browser.
 */
export async function readCatalogue(
  bytes: AsyncIterable<Uint8Array>,
  options: ReadOptions,
  sink: CatalogueSink,
): Promise<CatalogueReading> {
  const pieces = textPieces(bytes);
  const sample = await firstCharacters(pieces);
  const delimiter = detectDelimiter(sample, options.mapping);
  const records = new RecordBlocks(delimiter);
  const rows = new RowReader(delimiter, options);
  const take = async (block: RecordBlock | null) => {
    if (!block) return;
    for (const row of rows.read(block)) {
      if (!Array.isArray(row)) {
        const written = sink.grain(row);
        if (written) await written;
      } else for (const reject of row) await sink.reject(reject);
    }
  };
  await take(records.push(sample));
  for await (const piece of pieces) await take(records.push(piece));
  await take(records.finish());
  const warnings = rows.finish();
  const { accepted, rejected, blank, columns } = rows;
  return { accepted, rejected, blank, columns, warnings, delimiter };
}

async function firstCharacters(pieces: AsyncGenerator<string>): Promise<string> {
  let sample = '';
  while (sample.length < sampleLength) {
    const next = await pieces.next();
    if (next.done) break;
    sample += next.value;
  }
  return sample;
}
