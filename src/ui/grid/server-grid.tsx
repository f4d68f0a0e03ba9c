'use client';

import dynamic from 'next/dynamic';
import { useState } from 'react';
import type { FilterValues, GridColumn, GridFilter, GridSort } from './grid-column';
import { GridFilters } from './grid-filters';

export type ServerGridProps = {
  /** Where the rows come from, such as /api/v1/runs/<id>/grains. */
  endpoint: string;
  columns: readonly GridColumn[];
  /** What the rows are, as the name of the table for screen readers. */
  label: string;
  filters?: readonly GridFilter[];
  initialSort?: GridSort;
  height?: 'h-80' | 'h-[32rem]';
};

const InfiniteGrid = dynamic(async () => (await import('./infinite-grid')).InfiniteGrid, {
  ssr: false,
  loading: () => <p className="text-muted p-4">Loading the table ...</p>,
});

/** A table of any length: rows are fetched as they come into view; sorting and filtering happen in the database. */
export function ServerGrid({
  endpoint,
  columns,
  label,
  filters = [],
  initialSort,
  height = 'h-[32rem]',
}: ServerGridProps) {
  const [values, setValues] = useState<FilterValues>({});
  const [told, setTold] = useState('');
  return (
    <div className="min-w-0">
      {filters.length > 0 && <GridFilters filters={filters} onChange={setValues} label={label} />}
      <p className="text-muted my-2 text-sm" role="status">
        {told || 'Counting rows ...'}
      </p>
      <div
        className={`${height} border-line bg-panel w-full overflow-hidden rounded-md border`}
        role="region"
        aria-label={label}
      >
        <InfiniteGrid
          endpoint={endpoint}
          columns={columns}
          filters={values}
          initialSort={initialSort}
          onTold={setTold}
        />
      </div>
    </div>
  );
}
