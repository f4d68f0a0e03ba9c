import type { ReactNode } from 'react';

export type DataColumn<Row> = { header: ReactNode; isNumber?: boolean; show: (row: Row) => ReactNode };

type Props<Row> = {
  caption: string;
  columns: readonly DataColumn<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
  minWidth?: string;
};

/** A plain table that scrolls inside itself on narrow screens; its first column names the row. */
export function DataTable<Row>({ caption, columns, rows, rowKey, minWidth = 'min-w-[52rem]' }: Props<Row>) {
  const align = (column: DataColumn<Row>) =>
    column.isNumber ? 'text-right font-mono whitespace-nowrap tabular-nums' : 'text-left';
  return (
    <div className="overflow-x-auto" tabIndex={0} role="region" aria-label={`Table: ${caption}`}>
      <table className={`w-full ${minWidth} text-sm`}>
        <caption className="sr-only">{caption}</caption>
        <thead>
          <tr className="text-muted align-bottom">
            {columns.map((column, index) => (
              <th
                key={index}
                scope="col"
                className={`py-1.5 pr-8 font-medium ${column.isNumber ? 'text-right' : 'text-left'}`}
              >
                {column.header}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={rowKey(row)} className="border-line hover:bg-panel border-t align-top">
              {columns.map((column, index) =>
                index === 0 ? (
                  <th key={index} scope="row" className="py-2.5 pr-8 text-left font-medium">
                    {column.show(row)}
                  </th>
                ) : (
                  <td key={index} className={`py-2.5 pr-8 ${align(column)}`}>
                    {column.show(row)}
                  </td>
                ),
              )}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
