import type { ReactNode } from 'react';

export type DataColumn<Row> = { header: ReactNode; isNumber?: boolean; show: (row: Row) => ReactNode };

type Props<Row> = {
  caption: string;
  columns: readonly DataColumn<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
  /** On screens that are not narrow; what does not fit scrolls inside the table. */
  minWidth?: string;
};

const stackedLine = 'max-sm:grid max-sm:grid-cols-[7.5rem_minmax(0,1fr)] max-sm:gap-4 max-sm:py-1 sm:py-2.5 sm:pr-8';

/**
 * A plain table; its first column names the row. On narrow screens every row becomes a block with a line for each column.
 * Browsers forget what the parts of a table are when they are laid out otherwise, so the roles are said again.
 */
export function DataTable<Row>({ caption, columns, rows, rowKey, minWidth = 'sm:min-w-[52rem]' }: Props<Row>) {
  const [name, ...others] = columns;
  return (
    <div className="overflow-x-auto" tabIndex={0} role="region" aria-label={`Table: ${caption}`}>
      <table role="table" className={`w-full text-sm max-sm:block ${minWidth}`}>
        <caption className="sr-only">{caption}</caption>
        <thead role="rowgroup" className="max-sm:sr-only">
          <tr role="row" className="text-muted align-bottom">
            {columns.map((column, index) => (
              <th
                key={index}
                role="columnheader"
                scope="col"
                className={`py-1.5 pr-8 font-medium ${column.isNumber ? 'text-right' : 'text-left'}`}
              >
                {column.header}
              </th>
            ))}
          </tr>
        </thead>
        <tbody role="rowgroup" className="max-sm:block">
          {rows.map((row) => (
            <tr
              key={rowKey(row)}
              role="row"
              className="border-line hover:bg-panel border-t align-top max-sm:block max-sm:py-3"
            >
              <th
                role="rowheader"
                scope="row"
                className="text-left font-medium max-sm:block max-sm:text-base sm:py-2.5 sm:pr-8"
              >
                {name.show(row)}
              </th>
              {others.map((column, index) => (
                <td key={index} role="cell" className={`${stackedLine} ${lookOf(column)}`}>
                  <span className="text-muted font-sans sm:hidden" aria-hidden="true">
                    {column.header}
                  </span>
                  <div className="min-w-0">{column.show(row)}</div>
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

const lookOf = ({ isNumber }: Pick<DataColumn<never>, 'isNumber'>) =>
  isNumber ? 'font-mono tabular-nums sm:whitespace-nowrap sm:text-right' : '';
