import { CatalogueFault } from './catalogue-fault';
import type { ColumnMapping } from './mapping';
import { readHeaderName } from './header-name';
import { isBlankRow, parseBlock } from './parse-block';
import { RecordBlocks } from './record-blocks';

const delimiters = [',', ';', '\t', '|', ' '] as const;
export type Delimiter = (typeof delimiters)[number];

const rowsCompared = 50;

/** Characters of the beginning of a file that are enough to tell. */
export const sampleLength = 64 * 1024;

type Score = { known: number; steadiness: number; columns: number };

/**
 * The delimiter under which the header has most names that are understood; among equals, the one that gives the rows
 * most often as many cells as the header. A comma when nothing speaks for another.
 */
export function detectDelimiter(text: string, mapping?: ColumnMapping): Delimiter {
  const sample = text.slice(0, sampleLength);
  const mapped = new Set(Object.keys(mapping ?? {}).map((header) => header.trim()));
  let best: { delimiter: Delimiter; score: Score } = { delimiter: ',', score: { known: 0, steadiness: 0, columns: 1 } };
  for (const delimiter of delimiters) {
    const score = scoreOf(firstRows(sample, delimiter), mapped);
    if (score && isBetter(score, best.score)) best = { delimiter, score };
  }
  return best.delimiter;
}

function scoreOf(rows: string[][], mapped: ReadonlySet<string>): Score | null {
  if (rows.length === 0) return null;
  const [header, ...body] = rows;
  const known = header.filter(
    (cell) => mapped.has(cell.trim()) || readHeaderName(cell.trim()).kind === 'column',
  ).length;
  const steady = body.filter((row) => row.length === header.length).length;
  return {
    known,
    steadiness: header.length < 2 || body.length === 0 ? 0 : steady / body.length,
    columns: header.length,
  };
}

function isBetter(a: Score, b: Score): boolean {
  if (a.known !== b.known) return a.known > b.known;
  if (a.steadiness !== b.steadiness) return a.steadiness > b.steadiness;
  return a.steadiness > 0 && a.columns > b.columns;
}

/** A record that the sample cuts in half is left out; quotes that make no sense under this delimiter speak against it. */
function firstRows(sample: string, delimiter: Delimiter): string[][] {
  const records = new RecordBlocks(delimiter);
  try {
    const block = records.push(sample.length < sampleLength ? `${sample}\n` : sample) ?? records.completeSoFar();
    const rows = block ? parseBlock(block, delimiter) : [];
    return rows.filter((cells) => !isBlankRow(cells)).slice(0, rowsCompared);
  } catch (problem) {
    if (problem instanceof CatalogueFault) return [];
    throw problem;
  }
}
