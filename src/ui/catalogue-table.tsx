import Link from 'next/link';
import type { CatalogueItem } from '@/src/catalogues/schema';
import { Moment } from './run-moment';
import { StatusBadge } from './status-badge';

const columns = ['Catalogue', 'Status', 'Grains', 'Rejected rows', 'Materials', 'Uploaded', 'By'];
const numeric = new Set(['Grains', 'Rejected rows']);

export function CatalogueTable({ items }: { items: readonly CatalogueItem[] }) {
  return (
    <div className="overflow-x-auto" tabIndex={0} role="region" aria-label="Catalogues">
      <table className="w-full min-w-[52rem] text-sm">
        <caption className="sr-only">Catalogues, newest first</caption>
        <thead>
          <tr className="text-muted">
            {columns.map((column) => (
              <th
                key={column}
                scope="col"
                className={`py-1.5 pr-8 font-medium ${numeric.has(column) ? 'text-right' : 'text-left'}`}
              >
                {column}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {items.map((item) => (
            <tr key={item.id} className="border-line hover:bg-panel border-t">
              <th scope="row" className="max-w-72 py-2.5 pr-8 text-left font-medium">
                <Link href={`/catalogues/${item.id}`} className="block truncate hover:underline">
                  {item.name}
                </Link>
              </th>
              <td className="py-2.5 pr-8">
                <StatusBadge status={item.status} />
              </td>
              <td className="py-2.5 pr-8 text-right font-mono tabular-nums">
                {item.status === 'ready' ? item.rows.accepted.toLocaleString('en-US') : '—'}
              </td>
              <td className="py-2.5 pr-8 text-right font-mono tabular-nums">
                {item.rows.rejected.toLocaleString('en-US')}
              </td>
              <td className="max-w-60 truncate py-2.5 pr-8">
                {item.materials.map(({ material }) => material).join(', ') || '—'}
              </td>
              <td className="py-2.5 pr-8">
                <Moment iso={item.createdAt} />
              </td>
              <td className="py-2.5">{item.uploadedBy}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
