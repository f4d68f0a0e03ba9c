'use client';

import { useState } from 'react';
import type { MaterialItem } from '@/src/materials/schema';
import { usesAdvanced } from './run-draft';
import type { FormPartProps } from './run-form-part';
import { RunFormStructure } from './run-form-structure';
import { RunFormSurroundings } from './run-form-surroundings';
import { RunTextField } from './run-text-field';

export function RunFormAdvanced(props: FormPartProps & { materials: readonly MaterialItem[] }) {
  const { draft, problems, onChange } = props;
  const [startsOpen] = useState(() => usesAdvanced(draft));
  return (
    <details className="border-line group border-t pt-4" open={startsOpen || undefined}>
      <summary className="w-fit cursor-pointer font-serif text-xl">
        More effects <span className="text-muted font-sans text-sm">porosity, coating, wind, disc, charging</span>
      </summary>
      <div className="mt-4 grid gap-6">
        {draft.model === 'mie' && <RunFormStructure {...props} />}
        <RunFormSurroundings {...props} />
        <div className="max-w-xs">
          <RunTextField
            label="Beta of the parent body"
            value={draft.parentBeta}
            onChange={(parentBeta) => onChange({ parentBeta })}
            problem={problems['release.parentBeta']}
            hint="Leave empty for a body too large to feel the light."
          />
        </div>
      </div>
    </details>
  );
}
