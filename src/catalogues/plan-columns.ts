import { CatalogueFault } from './catalogue-fault';
import type { ColumnMapping } from './mapping';
import { columnFor, type ColumnPlan, type PlannedColumn, type Warning } from './column-plan';
import { sigmaFieldOf } from './measured-field';
import { planMappedColumn, planNamedColumn } from './plan-column';
import { understoodNames } from './understood-names';

export const maxColumns = 512;

export function planColumns(
  headerCells: readonly string[],
  mapping: ColumnMapping | undefined,
  line: number,
): { columns: ColumnPlan; warnings: Warning[] } {
  if (headerCells.length > maxColumns)
    throw new CatalogueFault(
      'tooManyColumns',
      `The header has ${headerCells.length} columns; ${maxColumns} is the most.`,
      line,
    );
  const headers = headerCells.map((cell) => cell.trim());
  refuseDuplicateHeaders(headers, line);
  const mapped = new Map(Object.entries(mapping ?? {}).map(([header, entry]) => [header.trim(), entry] as const));
  for (const header of mapped.keys())
    if (!headers.includes(header))
      throw new CatalogueFault(
        'mapping',
        `The mapping names a column "${header}", which the file does not have.`,
        line,
        header,
      );
  const warnings: Warning[] = [];
  const columns = headers.map((header, index) => {
    const entry = mapped.get(header);
    return entry ? planMappedColumn(header, index, entry, line) : planNamedColumn(header, index, line, warnings);
  });
  refuseDuplicateFields(columns, line);
  refuseWithoutSize(columns, headers, line);
  return { columns: columns.map((column) => withoutOrphanedSigma(column, columns, warnings)), warnings };
}

function refuseDuplicateHeaders(headers: string[], line: number): void {
  const firstAt = new Map<string, number>();
  headers.forEach((header, index) => {
    const key = header.normalize('NFKC').toLowerCase();
    const first = firstAt.get(key);
    if (header !== '' && first !== undefined)
      throw new CatalogueFault(
        'duplicateHeader',
        `Columns ${first + 1} and ${index + 1} are both called "${header}".`,
        line,
        header,
      );
    firstAt.set(key, index);
  });
}

function refuseDuplicateFields(columns: ColumnPlan, line: number): void {
  for (const column of columns) {
    const first = columnFor(columns, column.field);
    if (column.field !== 'ignore' && first && first !== column)
      throw new CatalogueFault(
        'duplicateField',
        `Columns ${first.index + 1} ("${first.header}") and ${column.index + 1} ("${column.header}") both hold the ${column.field}: keep one.`,
        line,
        column.header,
      );
  }
}

function refuseWithoutSize(columns: ColumnPlan, headers: string[], line: number): void {
  if ((['radius', 'diameter', 'mass'] as const).some((field) => columnFor(columns, field))) return;
  const shown = headers.slice(0, 12).map((header) => `"${header.slice(0, 60)}"`);
  const single =
    headers.length === 1 ? ' Columns may be separated by commas, semicolons, tabs, vertical bars or spaces.' : '';
  throw new CatalogueFault(
    'sizeMissing',
    `No column holds a size. Line ${line} was read as the header and names ${shown.join(', ')}${headers.length > 12 ? ' ...' : ''}.${single} ${understoodNames}`,
    line,
  );
}

function withoutOrphanedSigma(column: PlannedColumn, columns: ColumnPlan, warnings: Warning[]): PlannedColumn {
  const base = [...sigmaFieldOf].find(([, sigma]) => sigma === column.field)?.[0];
  if (!base || columnFor(columns, base)) return column;
  warnings.push({
    code: 'errorWithoutValue',
    message: `Column "${column.header}" was ignored: there is no ${base} column that it could belong to.`,
  });
  return { ...column, field: 'ignore', unit: null };
}
