'use client';

import type { MaterialItem } from '@/src/materials/schema';
import { RunSelectField } from '@/src/ui/run-select-field';
import { RunTextField } from '@/src/ui/run-text-field';
import type { UploadDraft, UploadProblems } from './upload-draft';

type Props = {
  draft: UploadDraft;
  problems: UploadProblems;
  wasTried: boolean;
  materials: readonly MaterialItem[];
  onChange: (changed: Partial<UploadDraft>) => void;
};

/** The name of the catalogue, and what rows take that do not say their density or material. */
export function NameAndDefaults({ draft, problems, wasTried, materials, onChange }: Props) {
  return (
    <div className="grid gap-4 sm:grid-cols-3">
      <RunTextField
        label="Name of the catalogue"
        value={draft.name}
        onChange={(name) => onChange({ name })}
        problem={wasTried ? problems.name : undefined}
        isNumber={false}
      />
      <RunTextField
        label="Density of rows without one"
        unit="g/cm³"
        value={draft.densityGCm3}
        onChange={(densityGCm3) => onChange({ densityGCm3 })}
        problem={problems.density}
        hint="For a file without a density column: a density is never guessed."
      />
      <RunSelectField
        label="Material of rows without one"
        value={draft.material}
        onChange={(material) => onChange({ material })}
        empty="none"
        choices={materials.map(({ slug, name }) => ({ value: slug, label: name }))}
      />
    </div>
  );
}
