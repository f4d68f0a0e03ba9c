import type { Metadata } from 'next';
import { listMaterials } from '@/src/materials/find-materials';
import type { MaterialItem } from '@/src/materials/schema';
import { DataTable, type DataColumn } from '@/src/ui/data-table';
import { ChemicalFormula, IndexedText } from '@/src/ui/lowered-text';
import { PageHeader } from '@/src/ui/page-header';
import { exactText } from '@/src/ui/run-figures';
import { sentence, withMicroSign } from '@/src/ui/sentence';
import { pageActor, pageEm } from '@/src/web/page';

export const metadata: Metadata = { title: 'Materials' };

const columns: DataColumn<MaterialItem>[] = [
  {
    header: 'Material',
    show: ({ name, slug }) => (
      <>
        {name}
        <span className="text-muted block font-mono text-xs font-normal">{slug}</span>
      </>
    ),
  },
  { header: 'Composition', show: ({ formula }) => <ChemicalFormula formula={formula} /> },
  {
    header: 'Density (g/cm³)',
    isNumber: true,
    show: ({ densityGCm3 }) => exactText(densityGCm3, 4),
  },
  {
    header: 'Measured between (µm)',
    isNumber: true,
    show: ({ validUm: [from, to] }) => `${exactText(from, 3)} – ${exactText(to, 3)}`,
  },
  { header: 'Also known as', show: ({ aliases }) => <span className="text-xs">{aliases.join(', ') || '—'}</span> },
  { header: 'Version', isNumber: true, show: ({ version }) => version },
  {
    header: 'Source and remarks',
    show: ({ citation, densitySource, note }) => (
      <span className="block max-w-md text-xs">
        {withMicroSign(citation)}
        <span className="text-muted mt-1 block">{sentence(`Density: ${densitySource}`)}</span>
        {note && (
          <span className="text-muted mt-1 block">
            <IndexedText text={sentence(note)} />
          </span>
        )}
      </span>
    ),
  },
];

export default async function MaterialsPage() {
  const actor = await pageActor();
  const { items } = await listMaterials(await pageEm(), actor);
  return (
    <>
      <PageHeader
        title="Materials"
        subtitle="Optical constants as sums of oscillators fitted to the measurements named here. They are used at all wavelengths; every run says which share of the starlight lies outside the measured range."
      />
      <DataTable
        caption="Materials"
        columns={columns}
        rows={items}
        rowKey={(material) => material.id}
        minWidth="sm:min-w-[64rem]"
      />
    </>
  );
}
