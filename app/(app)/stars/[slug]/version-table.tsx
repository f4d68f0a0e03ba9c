import type { StarItem } from '@/src/stars/schema';
import { ActionButton } from '@/src/ui/action-button';
import { DataTable, type DataColumn } from '@/src/ui/data-table';
import { exactText } from '@/src/ui/run-figures';
import { retireStarAction } from '../actions';

const columns: DataColumn<StarItem>[] = [
  { header: 'Version', show: ({ version }) => version },
  { header: 'State', show: ({ status }) => status },
  { header: 'Mass (M☉)', isNumber: true, show: ({ massSun }) => exactText(massSun, 4) },
  { header: 'Luminosity (L☉)', isNumber: true, show: ({ luminositySun }) => exactText(luminositySun, 4) },
  { header: 'Temperature (K)', isNumber: true, show: ({ teffK }) => teffK.toFixed(0) },
  { header: 'Source', show: ({ citation }) => <span className="block max-w-md text-xs">{citation}</span> },
];

const retire: DataColumn<StarItem> = {
  header: <span className="sr-only">Retire</span>,
  show: ({ id, status, version }) =>
    status === 'published' && (
      <ActionButton
        action={retireStarAction}
        fields={{ id }}
        variant="danger"
        label={`Retire version ${version}`}
        question="Retire this version? New runs can no longer use it; runs that have it keep it."
      >
        Retire
      </ActionButton>
    ),
};

export function VersionTable({ versions, manages }: { versions: readonly StarItem[]; manages: boolean }) {
  return (
    <DataTable
      caption="Versions"
      columns={manages ? [...columns, retire] : columns}
      rows={versions}
      rowKey={({ id }) => id}
    />
  );
}
