import { trimmed } from '@/src/ui/run-figures';
import type { GridColumn } from './grid-column';

const figures = 4;

/** What a cell says: four figures for numbers, whole counts in full, a dash where a quantity does not exist. */
export function cellText(column: GridColumn, value: unknown): string {
  if (value === null || value === undefined || value === '') return '—';
  if (column.kind === 'count' && Number.isInteger(value)) return String(value);
  if (column.kind === 'number' || column.kind === 'count') return trimmed(Number(value), figures);
  return column.kind === 'choice' ? (column.words[String(value)] ?? String(value)) : String(value);
}
