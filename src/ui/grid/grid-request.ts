import type { FilterValues, GridSort } from './grid-column';

export const rowsPerBlock = 100;

export type GridPage<Row> = { items: Row[]; next: string | null; total: number };

/** The address of one block of rows; only filters that say something are sent. */
export function gridRequest(endpoint: string, filters: FilterValues, sort: GridSort | null, offset: number): string {
  const query = new URLSearchParams();
  if (sort) {
    query.set('sort', sort.field);
    query.set('order', sort.order);
  }
  for (const [param, value] of Object.entries(filters)) if (value.trim() !== '') query.set(param, value.trim());
  query.set('limit', String(rowsPerBlock));
  if (offset > 0) query.set('offset', String(offset));
  return `${endpoint}?${query}`;
}
