'use client';

import { useActionState, type ReactNode } from 'react';
import type { FormState } from '@/src/web/form-state';
import { Button } from './button';
import type { ButtonVariant } from './button-style';

type Props = {
  action: (state: FormState, form: FormData) => Promise<FormState>;
  /** What the action is told, as hidden fields. */
  fields?: Readonly<Record<string, string>>;
  label?: string;
  variant?: ButtonVariant;
  /** Asked before something that cannot be undone. */
  question?: string;
  children: ReactNode;
};

/** One action behind one button; a refusal is said beside it. */
export function ActionButton({ action, fields = {}, label, variant = 'secondary', question, children }: Props) {
  const [state, send, isSending] = useActionState(action, {});
  return (
    <form
      action={send}
      onSubmit={(event) => question && !window.confirm(question) && event.preventDefault()}
      className="inline-grid justify-items-start gap-1"
    >
      {Object.entries(fields).map(([name, value]) => (
        <input key={name} type="hidden" name={name} value={value} />
      ))}
      <Button type="submit" size="small" variant={variant} disabled={isSending} aria-label={label}>
        {children}
      </Button>
      {state.message && (
        <p role="alert" className="text-danger max-w-64 text-sm">
          {state.message}
        </p>
      )}
    </form>
  );
}
