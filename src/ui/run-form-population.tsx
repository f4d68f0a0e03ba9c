'use client';

import Link from 'next/link';
import type { CatalogueItem } from '@/src/catalogues/schema';
import { FormPart, type FormPartProps } from './run-form-part';
import { RunSelectField } from './run-select-field';
import { RunTextField } from './run-text-field';

export function RunFormPopulation({
  draft,
  problems,
  onChange,
  catalogues,
}: FormPartProps & { catalogues: readonly CatalogueItem[] }) {
  const ready = catalogues.filter(({ status }) => status === 'ready');
  return (
    <FormPart title="Grains">
      <div className="grid gap-4 sm:grid-cols-2">
        <RunSelectField
          label="Catalogue"
          value={draft.catalogueId}
          onChange={(catalogueId) => onChange({ catalogueId })}
          problem={problems.catalogueId}
          empty="Choose a catalogue"
          choices={ready.map(({ id, name, rows }) => ({
            value: id,
            label: `${name} (${rows.accepted.toLocaleString('en-US')} grains)`,
          }))}
          hint={
            <>
              Not in the list?{' '}
              <Link href="/catalogues/new" className="underline">
                Upload a catalogue
              </Link>
            </>
          }
        />
        <RunTextField
          label="Name of the run"
          value={draft.name}
          onChange={(name) => onChange({ name })}
          problem={problems.name}
          isNumber={false}
          hint="May stay empty: catalogue and star then name it."
        />
      </div>
    </FormPart>
  );
}
