import type { ChangeSearch } from '@/src/audit/schema';
import { Button } from '@/src/ui/button';

const fields = [
  { name: 'person', label: 'Person', type: 'text' },
  { name: 'action', label: 'Action', type: 'text' },
  { name: 'target', label: 'What', type: 'text' },
  { name: 'from', label: 'From', type: 'date' },
  { name: 'to', label: 'To', type: 'date' },
] as const;

/** A plain form: the search stands in the address. */
export function ChangeSearchForm({ search, isInvalid }: { search: ChangeSearch; isInvalid: boolean }) {
  return (
    <form className="mb-6 flex flex-wrap items-end gap-3" aria-label="Search the changes">
      {fields.map(({ name, label, type }) => (
        <label key={name} className="grid gap-1 text-sm font-medium">
          {label}
          <input
            name={name}
            type={type}
            defaultValue={search[name] ?? ''}
            className="border-field bg-panel h-10 w-40 rounded-md border px-3 font-normal"
          />
        </label>
      ))}
      <Button type="submit">Search</Button>
      {isInvalid && (
        <p role="alert" className="text-danger basis-full text-sm">
          This search could not be read; all changes are shown.
        </p>
      )}
    </form>
  );
}
