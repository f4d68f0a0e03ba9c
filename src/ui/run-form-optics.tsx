'use client';

import { RunChoiceField } from './run-choice-field';
import { FormPart, type FormPartProps } from './run-form-part';
import { RunTextField } from './run-text-field';

const models = [
  { value: 'mie', label: 'Real materials', hint: 'Mie theory with the optical constants of each material' },
  { value: 'constant', label: 'One efficiency for all', hint: 'the same Q_pr at every radius' },
] as const;

export function RunFormOptics({ draft, problems, onChange }: FormPartProps) {
  return (
    <FormPart title="Optics">
      <RunChoiceField
        legend="How grains take up light"
        value={draft.model}
        onChange={(model) => onChange({ model })}
        choices={models}
      />
      {draft.model === 'constant' && (
        <div className="max-w-48">
          <RunTextField
            label="Q_pr"
            value={draft.qpr}
            onChange={(qpr) => onChange({ qpr })}
            problem={problems['optics.qpr']}
            hint="1 is the geometric limit."
          />
        </div>
      )}
    </FormPart>
  );
}
