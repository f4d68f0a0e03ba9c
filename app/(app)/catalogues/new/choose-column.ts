import type { ColumnField, ColumnMapping } from '@/src/catalogues/mapping';
import { quantityOf } from '@/src/catalogues/measured-field';
import type { PreviewColumn } from '@/src/catalogues/preview-catalogue';
import { unitSymbols } from '@/src/catalogues/units';

export function unitsOf(field: ColumnField): string[] {
  const quantity = quantityOf[field];
  return quantity ? unitSymbols(quantity) : [];
}

/** The mapping after a choice for one column; no unit is guessed, but one that the header says is kept. */
export function withChoice(mapping: ColumnMapping, column: PreviewColumn, field: ColumnField | null): ColumnMapping {
  const others = Object.fromEntries(Object.entries(mapping).filter(([header]) => header !== column.header));
  if (field === null) return others;
  const unit = column.unit !== null && unitsOf(field).includes(column.unit) ? { unit: column.unit } : {};
  return { ...others, [column.header]: { field, ...unit } };
}

export function choiceFor(mapping: ColumnMapping, header: string): ColumnMapping[string] | null {
  return Object.hasOwn(mapping, header) ? mapping[header] : null;
}
