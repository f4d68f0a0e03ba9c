'use client';

import { useId } from 'react';

type Props = {
  label: string;
  value: string;
  onChange: (value: string) => void;
  unit?: string;
  hint?: string;
  problem?: string;
  isNumber?: boolean;
};

/** One line of text or a number with its unit; the hint and the problem are tied to the input. */
export function RunTextField({ label, value, onChange, unit, hint, problem, isNumber = true }: Props) {
  const id = useId();
  const described = [hint && `${id}-hint`, problem && `${id}-problem`].filter(Boolean).join(' ');
  return (
    <div className="grid content-start gap-1">
      <label htmlFor={id} className="text-sm font-medium">
        {label}
        {unit && <span className="text-muted font-normal"> ({unit})</span>}
      </label>
      <input
        id={id}
        value={value}
        onChange={(event) => onChange(event.target.value)}
        inputMode={isNumber ? 'decimal' : undefined}
        autoComplete="off"
        aria-invalid={problem !== undefined}
        aria-describedby={described || undefined}
        className={`border-field bg-panel aria-invalid:border-danger h-10 w-full min-w-0 rounded-md border px-3 ${isNumber ? 'font-mono tabular-nums' : ''}`}
      />
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
