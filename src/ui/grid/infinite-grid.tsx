'use client';

import { useQueryClient } from '@tanstack/react-query';
import type { ColDef } from 'ag-grid-community';
import { AgGridReact } from 'ag-grid-react';
import { useMemo } from 'react';
import { cellText } from './cell-text';
import { documentNonce } from './document-nonce';
import type { FilterValues, GridColumn, GridSort } from './grid-column';
import { gridTheme } from './grid-modules';
import { rowsPerBlock } from './grid-request';
import { rowSource } from './row-source';

type Props = {
  endpoint: string;
  columns: readonly GridColumn[];
  filters: FilterValues;
  initialSort?: GridSort;
  onTold: (words: string) => void;
};

export function InfiniteGrid({ endpoint, columns, filters, initialSort, onTold }: Props) {
  const client = useQueryClient();
  const definitions = useMemo(() => columns.map((column) => definitionOf(column, initialSort)), [columns, initialSort]);
  const source = useMemo(() => rowSource({ client, endpoint, filters, onTold }), [client, endpoint, filters, onTold]);
  return (
    <AgGridReact
      theme={gridTheme}
      styleNonce={documentNonce()}
      rowModelType="infinite"
      datasource={source}
      columnDefs={definitions}
      cacheBlockSize={rowsPerBlock}
      maxConcurrentDatasourceRequests={2}
      blockLoadDebounceMillis={80}
      sortingOrder={['asc', 'desc', null]}
      suppressMultiSort
      ensureDomOrder
      suppressColumnVirtualisation
      enableCellTextSelection
    />
  );
}

const isNumeric = ({ kind }: GridColumn) => kind === 'number' || kind === 'count';

function definitionOf(column: GridColumn, sort?: GridSort): ColDef {
  return {
    field: column.field,
    headerName: column.unit ? `${column.header} (${column.unit})` : column.header,
    width: column.widthPx ?? 130,
    sortable: column.sortable ?? true,
    sort: sort?.field === column.field ? sort.order : undefined,
    valueFormatter: ({ value, data }) => (data === undefined ? '' : cellText(column, value)),
    cellClass: isNumeric(column) ? 'font-mono tabular-nums text-right' : undefined,
    headerClass: isNumeric(column) ? 'ag-right-aligned-header' : undefined,
  };
}
