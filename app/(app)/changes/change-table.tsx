import type { ChangeItem } from '@/src/audit/schema';
import { changeWords } from '@/src/ui/change-words';
import { DataTable, type DataColumn } from '@/src/ui/data-table';
import { Moment } from '@/src/ui/run-moment';

const columns: DataColumn<ChangeItem>[] = [
  { header: 'When', show: ({ at }) => <Moment iso={at} /> },
  { header: 'Who', show: ({ person }) => person },
  {
    header: 'Did',
    show: ({ action }) => (
      <>
        {changeWords(action)}
        <span className="text-muted block font-mono text-xs">{action}</span>
      </>
    ),
  },
  { header: 'What', show: ({ kind, target, targetId }) => `${kind} ${target || targetId}` },
  { header: 'Before', show: ({ before }) => <Facts of={before} /> },
  { header: 'After', show: ({ after }) => <Facts of={after} /> },
];

export function ChangeTable({ items }: { items: readonly ChangeItem[] }) {
  if (items.length === 0) return <p className="text-muted">No change matches.</p>;
  return (
    <DataTable
      caption="Changes, newest first"
      columns={columns}
      rows={items}
      rowKey={({ id }) => id}
      minWidth="min-w-[64rem]"
    />
  );
}

function Facts({ of }: { of: object | null }) {
  if (of === null) return <>—</>;
  return (
    <ul className="max-w-72 text-xs">
      {Object.entries(of).map(([name, value]) => (
        <li key={name} className="break-words">
          {name}: {typeof value === 'string' ? value : JSON.stringify(value)}
        </li>
      ))}
    </ul>
  );
}
