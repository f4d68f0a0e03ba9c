/** Exactly what is drawn, as a table: for the eye, for screen readers and as a file. */
export type PlotTable = {
  columns: { title: string; unit?: string }[];
  rows: (string | number | null)[][];
};

export const columnHeading = ({ title, unit }: PlotTable['columns'][number]) => (unit ? `${title} (${unit})` : title);

/** RFC 4180 with full precision; text that a spreadsheet would run as a formula is made plain. */
export function plotCsv({ columns, rows }: PlotTable): string {
  const lines = [columns.map(columnHeading), ...rows].map((cells) => cells.map(csvCell).join(','));
  return lines.join('\r\n') + '\r\n';
}

function csvCell(value: string | number | null): string {
  if (value === null) return '';
  if (typeof value === 'number') return String(value);
  const plain = /^[=+\-@\t\r]/.test(value) ? `'${value}` : value;
  return /[",\r\n]/.test(plain) ? `"${plain.replaceAll('"', '""')}"` : plain;
}
