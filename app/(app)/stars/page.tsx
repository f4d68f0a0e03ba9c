import type { Metadata } from 'next';
import Link from 'next/link';
import { may } from '@/src/access/policy';
import { listStars } from '@/src/stars/find-stars';
import type { StarItem } from '@/src/stars/schema';
import { DataTable, type DataColumn } from '@/src/ui/data-table';
import { LinkButton } from '@/src/ui/link-button';
import { PageHeader } from '@/src/ui/page-header';
import { exactText } from '@/src/ui/run-figures';
import { sentence } from '@/src/ui/sentence';
import { pageActor, pageEm } from '@/src/web/page';

export const metadata: Metadata = { title: 'Stars' };

const columns: DataColumn<StarItem>[] = [
  { header: 'Star', show: (star) => <NameAndSlug name={star.name} slug={star.slug} /> },
  { header: 'Type', show: (star) => star.spectralType ?? '—' },
  {
    header: (
      <>
        Mass (M<sub>☉</sub>)
      </>
    ),
    isNumber: true,
    show: (star) => exactText(star.massSun, 4),
  },
  {
    header: (
      <>
        Luminosity (L<sub>☉</sub>)
      </>
    ),
    isNumber: true,
    show: (star) => exactText(star.luminositySun, 4),
  },
  {
    header: (
      <>
        T<sub>eff</sub> (K)
      </>
    ),
    isNumber: true,
    show: (star) => star.teffK.toFixed(0),
  },
  {
    header: (
      <>
        Radius (R<sub>☉</sub>)
      </>
    ),
    isNumber: true,
    show: (star) => (star.radiusSun === null ? '—' : exactText(star.radiusSun, 4)),
  },
  { header: 'Spectrum', show: (star) => (star.spectrum === 'blackbody' ? 'black body' : 'table') },
  { header: 'Version', isNumber: true, show: (star) => star.version },
  { header: 'Source and remarks', show: (star) => <Source citation={star.citation} note={star.note} /> },
];

export default async function StarsPage() {
  const actor = await pageActor();
  const { items } = await listStars(await pageEm(), actor);
  const mayAdd = may(actor, 'star.manageOwn') || may(actor, 'star.manageShared');
  const actions = mayAdd && <LinkButton href="/stars/new">New star</LinkButton>;
  return (
    <>
      <PageHeader
        title="Stars"
        actions={actions}
        subtitle="Presets that a run can use. A run keeps the numbers it was made with, whatever becomes of the preset."
      />
      <DataTable
        caption="Star presets"
        columns={columns}
        rows={items}
        rowKey={(star) => star.id}
        minWidth="sm:min-w-[70rem]"
      />
    </>
  );
}

function NameAndSlug({ name, slug }: { name: string; slug: string }) {
  return (
    <>
      <Link href={`/stars/${slug}`} className="hover:underline">
        {name}
      </Link>
      <span className="text-muted block font-mono text-xs font-normal">{slug}</span>
    </>
  );
}

function Source({ citation, note }: { citation: string; note: string }) {
  return (
    <span className="block max-w-md text-xs">
      {citation}
      {note && <span className="text-muted mt-1 block">{sentence(note)}</span>}
    </span>
  );
}
