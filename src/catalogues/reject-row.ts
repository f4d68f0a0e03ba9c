/** One reason why one row was not accepted; a row with several problems has several. */
export type RejectRow = { line: number; column: string | null; value: string | null; reason: string; raw: string };

const maxCellLength = 200;
const maxRawLength = 2000;

export const cut = (text: string, length = maxCellLength): string =>
  text.length <= length ? text : `${text.slice(0, length - 1).replace(/[\ud800-\udbff]$/, '')}\u2026`;

/** The row as a person would see it again in the file, shortened. */
export function rawOf(cells: readonly string[], delimiter: string): string {
  let raw = '';
  for (const [index, cell] of cells.entries()) {
    const text = cut(cell);
    const needsQuotes = text.includes('"') || text.includes('\n') || text.includes(delimiter);
    raw += (index === 0 ? '' : delimiter) + (needsQuotes ? `"${text.replaceAll('"', '""')}"` : text);
    if (raw.length > maxRawLength) break;
  }
  return cut(raw, maxRawLength);
}
