import type { SessionItem } from '@/src/people/own-sessions';
import { ActionButton } from '@/src/ui/action-button';
import { DataTable, type DataColumn } from '@/src/ui/data-table';
import { Moment } from '@/src/ui/run-moment';
import { endSessionAction } from './actions';

const columns: DataColumn<SessionItem>[] = [
  {
    header: 'Browser',
    show: ({ userAgent, isThisOne }) => (
      <span className="block max-w-md text-xs break-words">
        {isThisOne ? 'This one: ' : ''}
        {userAgent || 'unknown'}
      </span>
    ),
  },
  { header: 'Begun', show: ({ begunAt }) => <Moment iso={begunAt} /> },
  { header: 'Last seen about', show: ({ seenAt }) => <Moment iso={seenAt} /> },
  {
    header: <span className="sr-only">End</span>,
    show: ({ id, isThisOne, begunAt }) =>
      isThisOne ? null : (
        <ActionButton
          action={endSessionAction}
          fields={{ id }}
          variant="danger"
          label={`End the session begun ${begunAt}`}
        >
          End
        </ActionButton>
      ),
  },
];

export function SessionTable({ sessions }: { sessions: readonly SessionItem[] }) {
  return <DataTable caption="Your sessions" columns={columns} rows={sessions} rowKey={({ id }) => id} />;
}
