import type { RunInputs } from '@/entities/run-inputs';
import type { RunSummary } from '@/entities/run-summary';
import type { GridColumn, GridFilter } from './grid/grid-column';

const fates = { unbound: 'unbound', bound: 'bound' };
const regimes = { unbound: 'blow-out', drag: 'drag', collisions: 'collisions' };

/** Columns that the inputs give no values for are left out. */
export function runGrainColumns(summary: RunSummary, inputs: RunInputs): GridColumn[] {
  const columns: (GridColumn | false)[] = [
    { field: 'ordinal', header: 'No.', kind: 'count', widthPx: 84 },
    { field: 'label', header: 'Label', kind: 'text', widthPx: 130 },
    { field: 'material', header: 'Material', kind: 'choice', words: materialNames(summary), widthPx: 180 },
    { field: 'radiusUm', header: 'Radius', unit: 'µm', kind: 'number' },
    { field: 'densityGCm3', header: 'Density', unit: 'g/cm³', kind: 'number', widthPx: 140 },
    { field: 'count', header: 'Count', kind: 'count', widthPx: 100 },
    { field: 'beta', header: 'Beta', kind: 'number', widthPx: 110 },
    { field: 'fate', header: 'Fate', kind: 'choice', words: fates, widthPx: 110 },
    { field: 'pUnbound', header: 'P(unbound)', kind: 'number' },
    { field: 'qpr', header: 'Q_pr', kind: 'number', widthPx: 100 },
    { field: 'regime', header: 'Fastest process', kind: 'choice', words: regimes, widthPx: 150 },
    { field: 'prTimeYr', header: 'Drag time', unit: 'yr', kind: 'number', widthPx: 140 },
    inputs.disc !== undefined && {
      field: 'collisionTimeYr',
      header: 'Collision time',
      unit: 'yr',
      kind: 'number',
      widthPx: 160,
    },
    { field: 'semiMajorAxisAu', header: 'New semi-major axis', unit: 'au', kind: 'number', widthPx: 200 },
    { field: 'eccentricity', header: 'New eccentricity', kind: 'number', widthPx: 160 },
    { field: 'vInfKmS', header: 'Speed far away', unit: 'km/s', kind: 'number', widthPx: 180 },
    { field: 'temperatureK', header: 'Temperature', unit: 'K', kind: 'number', widthPx: 150 },
    inputs.charging !== undefined && {
      field: 'lorentzRatio',
      header: 'Lorentz / gravity',
      kind: 'number',
      widthPx: 160,
    },
  ];
  return columns.filter((column) => column !== false);
}

export function runGrainFilters(summary: RunSummary): GridFilter[] {
  return [
    { kind: 'choice', param: 'fate', label: 'Fate', choices: choicesOf(fates) },
    { kind: 'choice', param: 'material', label: 'Material', choices: choicesOf(materialNames(summary)) },
    { kind: 'text', param: 'label', label: 'Label' },
    { kind: 'range', minParam: 'radiusUmMin', maxParam: 'radiusUmMax', label: 'Radius', unit: 'µm' },
    { kind: 'range', minParam: 'betaMin', maxParam: 'betaMax', label: 'Beta' },
  ];
}

const materialNames = ({ perMaterial }: RunSummary) =>
  Object.fromEntries(perMaterial.map(({ material, name }) => [material, name]));

const choicesOf = (words: Readonly<Record<string, string>>) =>
  Object.entries(words).map(([value, label]) => ({ value, label }));
