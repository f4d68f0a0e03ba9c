import Link from 'next/link';
import type { CatalogueItem } from '@/src/catalogues/schema';
import { DataTable, type DataColumn } from './data-table';
import { Moment } from './run-moment';
import { StatusBadge } from './status-badge';

const columns: DataColumn<CatalogueItem>[] = [
  {
    header: 'Catalogue',
    show: ({ id, name }) => (
      <Link href={`/catalogues/${id}`} className="block hover:underline max-sm:py-0.5 sm:max-w-72 sm:truncate">
        {name}
      </Link>
    ),
  },
  { header: 'Status', show: ({ status }) => <StatusBadge status={status} /> },
  {
    header: 'Grains',
    isNumber: true,
    show: ({ status, rows }) => (status === 'ready' ? rows.accepted.toLocaleString('en-US') : '—'),
  },
  { header: 'Rejected rows', isNumber: true, show: ({ rows }) => rows.rejected.toLocaleString('en-US') },
  {
    header: 'Materials',
    show: ({ materials }) => (
      <span className="block sm:max-w-60 sm:truncate">
        {materials.map(({ material }) => material).join(', ') || '—'}
      </span>
    ),
  },
  { header: 'Uploaded', show: ({ createdAt }) => <Moment iso={createdAt} /> },
  { header: 'By', show: ({ uploadedBy }) => uploadedBy },
];

export function CatalogueTable({ items }: { items: readonly CatalogueItem[] }) {
  return <DataTable caption="Catalogues, newest first" columns={columns} rows={items} rowKey={({ id }) => id} />;
}
