import type { CatalogueItem } from '@/src/catalogues/schema';
import { Moment } from '@/src/ui/run-moment';

export function CatalogueFacts({ catalogue }: { catalogue: CatalogueItem }) {
  const { rows, materials, byteSize, sha256, createdAt, onInvalidRows } = catalogue;
  const number = (value: number) => value.toLocaleString('en-US');
  const facts: [string, React.ReactNode][] = [
    [
      'Rows read',
      `${number(rows.accepted + rows.rejected + rows.blank)} = ${number(rows.accepted)} valid + ${number(rows.rejected)} not valid + ${number(rows.blank)} blank`,
    ],
    ['Materials', materials.map(({ material, grains }) => `${material} (${number(grains)})`).join(', ') || '—'],
    ['Rule for rows that are not valid', onInvalidRows === 'refuse' ? 'refuse the whole catalogue' : 'leave them out'],
    ['Size of the file', `${number(byteSize)} bytes`],
    [
      'SHA-256 of the file',
      <span key="sha" className="font-mono text-xs break-all">
        {sha256}
      </span>,
    ],
    ['Uploaded', <Moment key="moment" iso={createdAt} />],
  ];
  return (
    <dl className="grid gap-x-8 gap-y-2 sm:grid-cols-[max-content_minmax(0,1fr)]">
      {facts.map(([term, value]) => (
        <div key={term} className="contents">
          <dt className="text-muted max-sm:mt-1 max-sm:-mb-1.5">{term}</dt>
          <dd className="min-w-0">{value}</dd>
        </div>
      ))}
    </dl>
  );
}
