import type { ColumnField } from './mapping';

const maxRadiusM = 1;
const maxDensityKgM3 = 25_000;
const maxCount = 1e15;

/** Why a value in SI cannot stand in its column, or null. */
export function whyOutOfRange(field: ColumnField, valueSi: number): string | null {
  if (field.endsWith('Sigma')) return valueSi < 0 ? 'is negative, which an error cannot be' : null;
  if (valueSi <= 0) return 'must be greater than zero';
  switch (field) {
    case 'radius':
      return valueSi > maxRadiusM ? 'is a radius above 1 m: check the unit' : null;
    case 'diameter':
      return valueSi > 2 * maxRadiusM ? 'is a diameter above 2 m: check the unit' : null;
    case 'density':
      return valueSi > maxDensityKgM3 ? 'is a density above 25 g/cm3: check the unit' : null;
    case 'count':
      return valueSi > maxCount ? 'is a count above 1e15' : null;
    default:
      return null;
  }
}
