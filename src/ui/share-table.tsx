import type { ShareItem } from '@/src/sharing/schema';
import { Button } from './button';
import { DataTable, type DataColumn } from './data-table';
import { Moment } from './run-moment';

const words = { open: 'open', expired: 'expired', revoked: 'revoked' };

export function ShareTable({ shares, onRevoke }: { shares: readonly ShareItem[]; onRevoke?: (id: string) => void }) {
  const columns: DataColumn<ShareItem>[] = [
    { header: 'Made', show: ({ createdAt }) => <Moment iso={createdAt} /> },
    { header: 'By', show: ({ createdBy }) => createdBy },
    { header: 'State', show: ({ state }) => words[state] },
    { header: 'Until', show: ({ expiresAt }) => <Moment iso={expiresAt} /> },
    { header: 'Passphrase', show: ({ hasPassphrase }) => (hasPassphrase ? 'yes' : 'no') },
    { header: 'Download', show: ({ mayDownload }) => (mayDownload ? 'yes' : 'no') },
    { header: 'Views', isNumber: true, show: ({ views }) => views },
  ];
  const revoke: DataColumn<ShareItem> = {
    header: <span className="sr-only">Revoke</span>,
    show: ({ id, state, createdAt }) =>
      state === 'open' && (
        <Button
          size="small"
          variant="danger"
          onClick={() => onRevoke?.(id)}
          aria-label={`Revoke the link made ${createdAt}`}
        >
          Revoke
        </Button>
      ),
  };
  return (
    <div className="mt-8">
      <DataTable
        caption="Links to this run"
        columns={onRevoke ? [...columns, revoke] : columns}
        rows={shares}
        rowKey={({ id }) => id}
      />
    </div>
  );
}
