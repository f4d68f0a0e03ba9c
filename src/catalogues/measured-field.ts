import type { ColumnField } from './mapping';
import type { Quantity } from './units';

/** The quantity whose unit a column needs; null for columns without a unit. */
export const quantityOf: Readonly<Record<ColumnField, Quantity | null>> = {
  label: null,
  radius: 'length',
  diameter: 'length',
  mass: 'mass',
  density: 'density',
  material: null,
  count: null,
  radiusSigma: 'length',
  diameterSigma: 'length',
  massSigma: 'mass',
  densitySigma: 'density',
  ignore: null,
};

export const sigmaFieldOf: ReadonlyMap<ColumnField, ColumnField> = new Map([
  ['radius', 'radiusSigma'],
  ['diameter', 'diameterSigma'],
  ['mass', 'massSigma'],
  ['density', 'densitySigma'],
]);
