'use client';

import { useId, type ReactNode } from 'react';

type Props = {
  label: string;
  value: string;
  onChange: (value: string) => void;
  problem?: string;
  hint?: ReactNode;
  choices: readonly { value: string; label: string }[];
  /** What stands there before anything is chosen. */
  empty?: string;
};

export function RunSelectField({ label, value, onChange, problem, hint, choices, empty }: Props) {
  const id = useId();
  const described = [hint && `${id}-hint`, problem && `${id}-problem`].filter(Boolean).join(' ');
  return (
    <div className="grid content-start gap-1">
      <label htmlFor={id} className="text-sm font-medium">
        {label}
      </label>
      <select
        id={id}
        value={value}
        onChange={(event) => onChange(event.target.value)}
        aria-invalid={problem !== undefined}
        aria-describedby={described || undefined}
        className="border-field bg-panel aria-invalid:border-danger h-10 w-full min-w-0 rounded-md border px-3"
      >
        {empty !== undefined && <option value="">{empty}</option>}
        {choices.map((choice) => (
          <option key={choice.value} value={choice.value}>
            {choice.label}
          </option>
        ))}
      </select>
      {hint && (
        <p id={`${id}-hint`} className="text-muted text-xs">
          {hint}
        </p>
      )}
      {problem && (
        <p id={`${id}-problem`} className="text-danger text-sm">
          {problem}
        </p>
      )}
    </div>
  );
}
