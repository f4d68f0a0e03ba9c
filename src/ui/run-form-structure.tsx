'use client';

import type { MaterialItem } from '@/src/materials/schema';
import { RunChoiceField } from './run-choice-field';
import type { FormPartProps } from './run-form-part';
import { RunSelectField } from './run-select-field';
import { RunTextField } from './run-text-field';

const structures = [
  { value: 'solid', label: 'Solid' },
  { value: 'porous', label: 'Porous, all alike' },
  { value: 'fromDensity', label: 'Porous, by density', hint: '1 - density of the grain / density of its material' },
  { value: 'coated', label: 'Coated' },
] as const;

const mixingRules = [
  { value: 'bruggeman', label: 'Bruggeman' },
  { value: 'maxwellGarnett', label: 'Maxwell Garnett' },
] as const;

export function RunFormStructure({
  draft,
  problems,
  onChange,
  materials,
}: FormPartProps & { materials: readonly MaterialItem[] }) {
  const isPorous = draft.structure === 'porous' || draft.structure === 'fromDensity';
  return (
    <div className="grid gap-4">
      <RunChoiceField
        legend="Structure of the grains"
        value={draft.structure}
        onChange={(structure) => onChange({ structure })}
        choices={structures}
      />
      {draft.structure === 'porous' && (
        <div className="max-w-48">
          <RunTextField
            label="Porosity"
            value={draft.porosity}
            onChange={(porosity) => onChange({ porosity })}
            problem={problems['optics.porosity']}
            hint="Share of vacuum, 0 to 0.99"
          />
        </div>
      )}
      {isPorous && (
        <RunChoiceField
          legend="Mixing rule"
          value={draft.mixing}
          onChange={(mixing) => onChange({ mixing })}
          choices={mixingRules}
        />
      )}
      {draft.structure === 'coated' && (
        <div className="grid gap-4 sm:grid-cols-2">
          <RunSelectField
            label="Coating"
            value={draft.mantleMaterial}
            onChange={(mantleMaterial) => onChange({ mantleMaterial })}
            problem={problems['optics.mantle.material']}
            empty="Choose a material"
            choices={materials.map(({ slug, name }) => ({ value: slug, label: name }))}
          />
          <RunTextField
            label="Share of the volume"
            value={draft.mantleFraction}
            onChange={(mantleFraction) => onChange({ mantleFraction })}
            problem={problems['optics.mantle.volumeFraction']}
            hint="Between 0 and 1"
          />
        </div>
      )}
    </div>
  );
}
