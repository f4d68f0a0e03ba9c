/**
 * Text that a spreadsheet would run as a formula; plain numbers such as -1.5 are not (OWASP, CSV injection). The pattern has
 * no tail on purpose: a line break in the cell must not let it through.
 */
const formula = /^(?![-+]?(?:\d+\.?\d*|\.\d+)(?:[eE][-+]?\d+)?$)[=+\-@\t\r\n\uff1d\uff0b\uff0d\uff20]/;
const needsQuotes = /[",\r\n]|^\s|\s$/;

type CsvValue = string | number | boolean | null;

/** One line of a CSV file (RFC 4180) with its CR LF. Numbers in the shortest form that reads back to the same bits. */
export const csvLine = (values: readonly CsvValue[]): string => `${values.map(csvCell).join(',')}\r\n`;

function csvCell(value: CsvValue): string {
  if (value === null) return '';
  if (typeof value === 'number') {
    if (!Number.isFinite(value))
      throw new Error(`A CSV cell cannot hold ${value}: say null where a quantity does not exist.`);
    return String(value);
  }
  if (typeof value === 'boolean') return value ? 'true' : 'false';
  const harmless = formula.test(value) ? `'${value}` : value;
  return needsQuotes.test(harmless) ? `"${harmless.replaceAll('"', '""')}"` : harmless;
}
