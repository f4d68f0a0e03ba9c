'use client';

import { FormField } from '@/src/ui/form-field';
import type { FormState } from '@/src/web/form-state';

export type StarValues = Partial<
  Record<'name' | 'spectralType' | 'massSun' | 'luminositySun' | 'teffK' | 'radiusSun' | 'citation' | 'note', string>
>;

const fields: { name: keyof StarValues; label: string; hint?: string; isNumber?: boolean; required?: boolean }[] = [
  { name: 'name', label: 'Name', required: true },
  { name: 'spectralType', label: 'Spectral type' },
  { name: 'massSun', label: 'Mass (M☉)', hint: '0.05 to 100', isNumber: true, required: true },
  { name: 'luminositySun', label: 'Luminosity (L☉)', hint: '1e-5 to 1e6', isNumber: true, required: true },
  { name: 'teffK', label: 'Effective temperature (K)', hint: '2000 to 60000', isNumber: true, required: true },
  { name: 'radiusSun', label: 'Radius (R☉)', hint: 'May stay empty', isNumber: true },
  { name: 'citation', label: 'Source of the numbers', required: true },
  { name: 'note', label: 'Remarks' },
];

/** The numbers of a star with their units and ranges; what was typed stays after a refusal. */
export function StarFields({ values, state }: { values: StarValues; state: FormState }) {
  return (
    <div className="grid gap-4 sm:grid-cols-2">
      {fields.map(({ name, label, hint, isNumber, required }) => (
        <FormField
          key={name}
          name={name}
          label={label}
          hint={hint}
          required={required}
          inputMode={isNumber ? 'decimal' : undefined}
          autoComplete="off"
          defaultValue={state.values?.[name] ?? values[name] ?? ''}
          problem={state.problems?.[name]}
        />
      ))}
    </div>
  );
}
