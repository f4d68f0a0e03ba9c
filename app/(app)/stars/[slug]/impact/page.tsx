import type { Metadata } from 'next';
import { starImpact } from '@/src/runs/star-impact';
import type { ImpactItem } from '@/src/runs/impact-schema';
import { DataTable, type DataColumn } from '@/src/ui/data-table';
import { EmptyState } from '@/src/ui/empty-state';
import { LinkButton } from '@/src/ui/link-button';
import { PageHeader } from '@/src/ui/page-header';
import { intervalsInWords } from '@/src/ui/run-answer';
import { percentText } from '@/src/ui/run-figures';
import { pageActor, pageEm } from '@/src/web/page';
import { idOrNowhere, onlyOne, orNowhere } from '../../../nowhere';

export const metadata: Metadata = { title: 'What a version would change' };

type Props = { params: Promise<{ slug: string }>; searchParams: Promise<{ version?: string | string[] }> };

const columns: DataColumn<ImpactItem>[] = [
  { header: 'Run', show: ({ run }) => run },
  { header: 'Group', show: ({ group }) => group },
  { header: 'Used version', isNumber: true, show: ({ usedVersion }) => usedVersion },
  { header: 'Unbound, by number', isNumber: true, show: ({ shareBefore }) => percentText(shareBefore) },
  { header: 'It would be', isNumber: true, show: ({ shareAfter }) => percentText(shareAfter) },
  {
    header: 'Unbound radii, then and now',
    show: ({ materials }) => (
      <ul className="text-xs">
        {materials.map(({ material, before, after }) => (
          <li key={material}>
            {material}: {intervalsInWords(before)} → {intervalsInWords(after)}
          </li>
        ))}
      </ul>
    ),
  },
];

export default async function ImpactPage({ params, searchParams }: Props) {
  const { slug } = await params;
  const version = idOrNowhere(onlyOne((await searchParams).version) ?? '');
  const items = await orNowhere(starImpact(await pageEm(), await pageActor(), version));
  const actions = (
    <>
      <LinkButton href={`/stars/${slug}`}>Back to the star</LinkButton>
      <LinkButton href={`/api/v1/stars/${version}/impact.csv`} download>
        Download (CSV)
      </LinkButton>
    </>
  );
  return (
    <>
      <PageHeader
        title="What this version would change"
        subtitle="The newest 20 finished runs of this star with up to 200,000 grains, computed anew with the version’s numbers. Nothing stored changes."
        actions={actions}
      />
      {items.length === 0 ? (
        <EmptyState title="No finished run uses this star">Publishing changes no answer that anybody has.</EmptyState>
      ) : (
        <DataTable
          caption="Runs and what would change"
          columns={columns}
          rows={items}
          rowKey={({ run, group }) => `${group} ${run}`}
          minWidth="min-w-[64rem]"
        />
      )}
    </>
  );
}
