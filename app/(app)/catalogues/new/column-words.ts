import type { ColumnField } from '@/src/catalogues/mapping';
import type { PreviewColumn } from '@/src/catalogues/preview-catalogue';

export const fieldWords: Record<ColumnField, string> = {
  ignore: 'leave this column out',
  label: 'label',
  radius: 'radius',
  radiusSigma: 'one-sigma error of the radius',
  diameter: 'diameter',
  diameterSigma: 'one-sigma error of the diameter',
  mass: 'mass',
  massSigma: 'one-sigma error of the mass',
  density: 'density',
  densitySigma: 'one-sigma error of the density',
  material: 'material',
  count: 'count',
};

const spelled: Record<string, string> = { um: 'µm', ug: 'µg', g_cm3: 'g/cm³', kg_m3: 'kg/m³' };

export const unitWords = (symbol: string): string => spelled[symbol] ?? symbol;

/** What happens to a column for which nobody has chosen anything. */
export function asItStands({ header, field, problem }: PreviewColumn): string {
  if (problem === null && field) return fieldWords[field];
  if (problem === 'unitMissing' && field) return `${fieldWords[field]}, but in which unit?`;
  if (problem === 'unitUnknown' && field) return `${fieldWords[field]}, in an unknown unit`;
  if (problem === 'radiusOrDiameter') return 'radius or diameter?';
  return header === '' ? 'no name: left out' : 'not known: left out';
}

/** These stop the upload until somebody says what is meant. */
export const needsAnswer = ({ problem }: PreviewColumn): boolean =>
  problem === 'unitMissing' || problem === 'unitUnknown' || problem === 'radiusOrDiameter';
