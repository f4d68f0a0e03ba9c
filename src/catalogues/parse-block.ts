import Papa from 'papaparse';
import { CatalogueFault } from './catalogue-fault';
import type { RecordBlock } from './record-blocks';
import { singleSpaces } from './single-spaces';

/** Cells of whole records. Headers are never left to the parser: it loses a column called __proto__ and renames twins. */
export function parseBlock(block: RecordBlock, delimiter: string): string[][] {
  if (block.text === '') return [['']];
  const text = delimiter === ' ' ? singleSpaces(block.text) : block.text;
  const { data, errors } = Papa.parse<string[]>(text, {
    delimiter,
    newline: '\n',
    header: false,
    skipEmptyLines: false,
  });
  if (errors.length > 0)
    throw new CatalogueFault(
      'strayQuote',
      `The quotation marks between line ${block.line} and the next rows could not be followed.`,
      block.line,
    );
  return data;
}

/** Lines of the file that a parsed row takes up. */
export function linesOf(cells: readonly string[], hasQuotes: boolean): number {
  let lines = 1;
  if (hasQuotes)
    for (const cell of cells) for (let at = cell.indexOf('\n'); at >= 0; at = cell.indexOf('\n', at + 1)) lines++;
  return lines;
}

export const isBlankRow = (cells: readonly string[]): boolean =>
  cells.every((cell) => cell === '' || cell.trim() === '');
