import type { ColumnField } from './mapping';
import type { Unit } from './units';

export type PlannedColumn = { index: number; header: string; field: ColumnField; unit: Unit | null };
export type ColumnPlan = PlannedColumn[];

export const columnFor = (plan: ColumnPlan, field: ColumnField): PlannedColumn | null =>
  plan.find((column) => column.field === field) ?? null;

/** Something the reader should know although the file was accepted. */
export type Warning = { code: string; message: string };
