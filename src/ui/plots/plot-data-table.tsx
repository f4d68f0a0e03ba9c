'use client';

import { useState } from 'react';
import { trimmed } from '@/src/ui/run-figures';
import { columnHeading, type PlotTable } from './plot-table';

const shownDigits = 4;

/** The numbers behind a plot. Rows are put in the page only once it is opened: a curve has hundreds. */
export function PlotDataTable({ table, title }: { table: PlotTable; title: string }) {
  const [opened, setOpened] = useState(false);
  return (
    <details className="text-sm" onToggle={(event) => setOpened(event.currentTarget.open)}>
      <summary className="text-muted hover:text-ink w-fit cursor-pointer py-1">
        Show data ({table.rows.length} rows)
      </summary>
      {opened && (
        <div
          className="border-line mt-1 max-h-72 overflow-auto rounded border"
          tabIndex={0}
          role="region"
          aria-label={`Data: ${title}`}
        >
          <table className="w-full text-right font-mono tabular-nums">
            <caption className="sr-only">{title}</caption>
            <thead className="bg-paper sticky top-0">
              <tr>
                {table.columns.map((column) => (
                  <th
                    key={column.title}
                    scope="col"
                    className="border-line border-b px-3 py-1 font-sans font-medium whitespace-nowrap"
                  >
                    {columnHeading(column)}
                  </th>
                ))}
              </tr>
            </thead>
            <tbody>
              {table.rows.map((cells, row) => (
                <tr key={row} className="odd:bg-line/20">
                  {cells.map((cell, column) => (
                    <td key={column} className="px-3 py-0.5 whitespace-nowrap">
                      {cell === null ? '—' : typeof cell === 'number' ? trimmed(cell, shownDigits) : cell}
                    </td>
                  ))}
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      )}
    </details>
  );
}
