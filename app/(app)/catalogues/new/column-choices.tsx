'use client';

import type { ColumnMapping } from '@/src/catalogues/mapping';
import type { CataloguePreview } from '@/src/catalogues/preview-catalogue';
import { ColumnChoice } from './column-choice';

type Props = {
  preview: CataloguePreview;
  mapping: ColumnMapping;
  onChange: (mapping: ColumnMapping) => void;
};

const shownValues = 3;
const headings = ['Column and first values', 'Holds', 'Unit'];

/** What each column holds: as its header says, or as the person says. */
export function ColumnChoices({ preview, mapping, onChange }: Props) {
  const firstRows = preview.rows.slice(0, shownValues);
  return (
    <div className="overflow-x-auto" tabIndex={0} role="region" aria-label="Table: columns of the file">
      <table className="w-full text-sm">
        <caption className="sr-only">Columns of the file with their first values, and what they hold</caption>
        <thead className="text-muted text-left">
          <tr>
            {headings.map((heading) => (
              <th key={heading} scope="col" className="py-1.5 pr-3 font-medium sm:pr-6">
                {heading}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {preview.columns.map((column) => (
            <ColumnChoice
              key={column.index}
              column={column}
              firstValues={firstRows.map((row) => row[column.index] ?? '')}
              mapping={mapping}
              onChange={onChange}
            />
          ))}
        </tbody>
      </table>
    </div>
  );
}
