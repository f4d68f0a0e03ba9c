'use client';

import { useMemo } from 'react';
import type { CatalogueItem } from '@/src/catalogues/schema';
import type { GridColumn, GridFilter } from '@/src/ui/grid/grid-column';
import { ServerGrid } from '@/src/ui/grid/server-grid';

const columns: GridColumn[] = [
  { field: 'line', header: 'Line', kind: 'count', widthPx: 96 },
  { field: 'label', header: 'Label', kind: 'text', widthPx: 140 },
  { field: 'radiusUm', header: 'Radius', unit: 'µm', kind: 'number', widthPx: 140 },
  { field: 'radiusSigmaUm', header: 'σ of radius', unit: 'µm', kind: 'number', widthPx: 160 },
  { field: 'densityGCm3', header: 'Density', unit: 'g/cm³', kind: 'number', widthPx: 150 },
  { field: 'densitySigmaGCm3', header: 'σ of density', unit: 'g/cm³', kind: 'number', widthPx: 170 },
  { field: 'material', header: 'Material', kind: 'text', widthPx: 150 },
  { field: 'count', header: 'Count', kind: 'number', widthPx: 130 },
];

/** They fit into the lower of the two heights. */
const fewRows = 10;

export function CatalogueGrains({ catalogue }: { catalogue: CatalogueItem }) {
  const filters = useMemo<GridFilter[]>(
    () => [
      {
        kind: 'choice',
        param: 'material',
        label: 'Material',
        choices: catalogue.materials.map(({ material }) => ({ value: material, label: material })),
      },
      { kind: 'text', param: 'label', label: 'Label' },
      { kind: 'range', minParam: 'radiusUmMin', maxParam: 'radiusUmMax', label: 'Radius', unit: 'µm' },
    ],
    [catalogue.materials],
  );
  return (
    <ServerGrid
      endpoint={`/api/v1/catalogues/${catalogue.id}/grains`}
      columns={columns}
      filters={filters}
      label="Grains of the catalogue"
      height={catalogue.rows.accepted < fewRows ? 'h-80' : 'h-[32rem]'}
    />
  );
}
