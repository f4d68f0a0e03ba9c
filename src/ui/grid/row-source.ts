import type { QueryClient } from '@tanstack/react-query';
import type { IDatasource } from 'ag-grid-community';
import { apiGet, sayProblem } from '@/src/ui/run-api';
import type { FilterValues } from './grid-column';
import { gridRequest, type GridPage } from './grid-request';

type Source = { client: QueryClient; endpoint: string; filters: FilterValues; onTold: (words: string) => void };

const staleAfterMs = 60_000;

export function rowSource({ client, endpoint, filters, onTold }: Source): IDatasource {
  return {
    getRows: async ({ startRow, sortModel, successCallback, failCallback }) => {
      const [sorted] = sortModel;
      const sort = sorted ? { field: sorted.colId, order: sorted.sort } : null;
      const path = gridRequest(endpoint, filters, sort, startRow);
      try {
        const page = await client.fetchQuery({
          queryKey: ['rows', path],
          queryFn: ({ signal }) => apiGet<GridPage<unknown>>(path, signal),
          staleTime: staleAfterMs,
        });
        successCallback(page.items, page.total);
        onTold(
          countWords(
            page.total,
            Object.values(filters).some((value) => value !== ''),
          ),
        );
      } catch (error) {
        failCallback();
        onTold(sayProblem(error));
      }
    },
  };
}

export function countWords(total: number, isFiltered: boolean): string {
  const rows = `${total.toLocaleString('en-US')} row${total === 1 ? '' : 's'}`;
  return isFiltered ? `${rows} with this filter.` : `${rows}.`;
}
