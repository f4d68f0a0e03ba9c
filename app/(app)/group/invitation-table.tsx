'use client';

import type { InvitationItem } from '@/src/people/find-group';
import { ActionButton } from '@/src/ui/action-button';
import { DataTable, type DataColumn } from '@/src/ui/data-table';
import { roleWords } from '@/src/ui/role-words';
import { Moment } from '@/src/ui/run-moment';
import { revokeInvitationAction } from './actions';

const columns: DataColumn<InvitationItem>[] = [
  { header: 'Invited', show: ({ email }) => <span className="break-all">{email}</span> },
  { header: 'As', show: ({ role }) => roleWords[role] },
  { header: 'By', show: ({ invitedBy }) => invitedBy },
  { header: 'Open until', show: ({ expiresAt }) => <Moment iso={expiresAt} /> },
  {
    header: <span className="sr-only">Revoke</span>,
    show: ({ id, email }) => (
      <ActionButton
        action={revokeInvitationAction}
        fields={{ id }}
        variant="danger"
        label={`Revoke the invitation of ${email}`}
      >
        Revoke
      </ActionButton>
    ),
  },
];

export function InvitationTable({ invitations }: { invitations: readonly InvitationItem[] }) {
  if (invitations.length === 0) return null;
  return (
    <div className="mt-8">
      <DataTable caption="Open invitations" columns={columns} rows={invitations} rowKey={({ id }) => id} />
    </div>
  );
}
