import type { Metadata } from 'next';
import { permissions, type Role } from '@/src/access/policy';
import { DataTable, type DataColumn } from '@/src/ui/data-table';
import { PageHeader } from '@/src/ui/page-header';
import { roleWords } from '@/src/ui/role-words';

export const metadata: Metadata = { title: 'Roles' };

const shown: Role[] = ['pi', 'researcher', 'student', 'groupless', 'admin'];
type Row = { does: string; roles: readonly Role[] };

const columns: DataColumn<Row>[] = [
  { header: 'Whoever wants to', show: ({ does }) => does },
  ...shown.map((role): DataColumn<Row> => ({
    header: roleWords[role],
    show: ({ roles }) => (roles.includes(role) ? 'yes' : <span className="text-muted">no</span>),
  })),
];

export default function RolesPage() {
  return (
    <>
      <PageHeader
        title="Roles"
        subtitle="Who may do what: this page is made from the very table that decides. An administrator has these rights besides those of a role in a group."
      />
      <DataTable
        caption="Permissions by role"
        columns={columns}
        rows={Object.values<Row>(permissions)}
        rowKey={({ does }) => does}
      />
    </>
  );
}
