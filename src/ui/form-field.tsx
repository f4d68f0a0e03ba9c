import type { InputHTMLAttributes } from 'react';

type Props = InputHTMLAttributes<HTMLInputElement> & { name: string; label: string; hint?: string; problem?: string };

/** A field of a plain form; works before any script has loaded. */
export function FormField({ name, label, hint, problem, ...input }: Props) {
  const described = [hint && `${name}-hint`, problem && `${name}-problem`].filter(Boolean).join(' ');
  return (
    <div className="grid gap-1">
      <label htmlFor={name} className="text-sm font-medium">
        {label}
      </label>
      <input
        id={name}
        name={name}
        aria-invalid={problem !== undefined}
        aria-describedby={described || undefined}
        className="border-field bg-panel aria-invalid:border-danger h-11 w-full rounded-md border px-3"
        {...input}
      />
      {hint && (
        <p id={`${name}-hint`} className="text-muted text-sm">
          {hint}
        </p>
      )}
      {problem && (
        <p id={`${name}-problem`} className="text-danger text-sm">
          {problem}
        </p>
      )}
    </div>
  );
}
