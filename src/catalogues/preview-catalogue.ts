import { CatalogueFault } from './catalogue-fault';
import type { ColumnField } from './mapping';
import { TextDecoding } from './decode';
import { detectDelimiter, type Delimiter } from './detect-delimiter';
import type { GrainRow } from './grain-row';
import { readHeaderName, type HeaderReading } from './header-name';
import { LineEndings } from './line-endings';
import { isBlankRow, parseBlock } from './parse-block';
import type { Warning } from './column-plan';
import type { ReadOptions } from './read-options';
import { RecordBlocks, type RecordBlock } from './record-blocks';
import type { RejectRow } from './reject-row';
import { RowReader } from './row-reader';

export type PreviewColumn = {
  index: number;
  header: string;
  field: ColumnField | null;
  unit: string | null;
  problem: HeaderReading['kind'] | null;
};

export type CataloguePreview = {
  delimiter: Delimiter | null;
  columns: PreviewColumn[];
  rows: string[][];
  /** The sentence that would refuse the whole file as it stands. */
  fault: string | null;
  accepted: GrainRow[];
  problems: RejectRow[];
  warnings: Warning[];
};

export type PreviewOptions = Omit<ReadOptions, 'maxRows'> & { rows?: number; isWholeFile: boolean };

/** What the beginning of a file would become, for the person who is about to upload it. */
export function previewCatalogue(
  firstBytes: Uint8Array,
  { rows = 20, isWholeFile, ...options }: PreviewOptions,
): CataloguePreview {
  const preview: CataloguePreview = {
    delimiter: null,
    columns: [],
    rows: [],
    fault: null,
    accepted: [],
    problems: [],
    warnings: [],
  };
  try {
    const text = decoded(firstBytes, isWholeFile);
    if (text.trim() === '') throw new CatalogueFault('empty', 'The file is empty.');
    const delimiter = detectDelimiter(text, options.mapping);
    preview.delimiter = delimiter;
    const blocks = blocksOf(text, delimiter, isWholeFile);
    const [header = [], ...body] = blocks
      .flatMap((block) => parseBlock(block, delimiter))
      .filter((cells) => !isBlankRow(cells));
    preview.columns = header.map(previewColumn);
    preview.rows = body.slice(0, rows);
    const reader = new RowReader(delimiter, { ...options, maxRows: Infinity });
    for (const block of blocks) {
      for (const row of reader.read(block)) {
        if (!Array.isArray(row)) preview.accepted.push(row);
        else preview.problems.push(...row);
      }
    }
    preview.warnings = reader.finish();
  } catch (fault) {
    if (!(fault instanceof CatalogueFault)) throw fault;
    preview.fault = fault.message;
  }
  return preview;
}

function decoded(bytes: Uint8Array, isWholeFile: boolean): string {
  const decoding = new TextDecoding();
  const text = decoding.push(bytes) + (isWholeFile ? decoding.finish() : '');
  return new LineEndings().push(text, isWholeFile);
}

/** The row that the end of a beginning cuts in half is left out. */
function blocksOf(text: string, delimiter: Delimiter, isWholeFile: boolean): RecordBlock[] {
  const records = new RecordBlocks(delimiter);
  const blocks = [records.push(text), isWholeFile ? records.finish() : records.completeSoFar()];
  return blocks.filter((block) => block !== null);
}

function previewColumn(cell: string, index: number): PreviewColumn {
  const header = cell.trim();
  const reading = readHeaderName(header);
  if (reading.kind === 'column')
    return { index, header, field: reading.field, unit: reading.unit?.symbol ?? null, problem: null };
  return { index, header, field: 'field' in reading ? reading.field : null, unit: null, problem: reading.kind };
}
