'use client';

import type { MemberItem } from '@/src/people/find-group';
import { ActionButton } from '@/src/ui/action-button';
import { DataTable, type DataColumn } from '@/src/ui/data-table';
import { roleWords } from '@/src/ui/role-words';
import { Moment } from '@/src/ui/run-moment';
import { removeMemberAction } from './actions';
import { RoleForm } from './role-form';

type Props = { members: readonly MemberItem[]; self: string; manages: boolean };

export function MemberTable({ members, self, manages }: Props) {
  const columns: DataColumn<MemberItem>[] = [
    { header: 'Person', show: ({ name, personId }) => (personId === self ? `${name} (you)` : name) },
    { header: 'E-mail address', show: ({ email }) => <span className="break-all">{email}</span> },
    { header: 'Role', show: (member) => (manages ? <RoleForm member={member} /> : roleWords[member.role]) },
    { header: 'Since', show: ({ since }) => <Moment iso={since} /> },
  ];
  const remove: DataColumn<MemberItem> = {
    header: <span className="sr-only">Remove</span>,
    show: ({ personId, name }) =>
      personId === self ? null : (
        <ActionButton
          action={removeMemberAction}
          fields={{ personId }}
          variant="danger"
          label={`Remove ${name}`}
          question={`Remove ${name} from the group? What they made stays.`}
        >
          Remove
        </ActionButton>
      ),
  };
  return (
    <DataTable
      caption="People of the group"
      columns={manages ? [...columns, remove] : columns}
      rows={members}
      rowKey={({ personId }) => personId}
    />
  );
}
