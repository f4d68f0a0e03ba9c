'use client';

import { useActionState, useId } from 'react';
import { Button } from '@/src/ui/button';
import type { FormState } from '@/src/web/form-state';

type Props = {
  action: (state: FormState, form: FormData) => Promise<FormState>;
  label: string;
  name?: string;
  button: string;
};

export function GroupNameForm({ action, label, name, button }: Props) {
  const id = useId();
  const [state, send, isSending] = useActionState(action, {});
  const problem = state.problems?.name ?? state.message;
  return (
    <form action={send} className="grid max-w-xl gap-1">
      <label htmlFor={id} className="text-sm font-medium">
        {label}
      </label>
      <div className="flex gap-3">
        <input
          id={id}
          name="name"
          required
          maxLength={200}
          defaultValue={state.values?.name ?? name}
          aria-invalid={problem !== undefined}
          aria-describedby={problem ? `${id}-problem` : undefined}
          className="border-field bg-panel h-10 min-w-0 grow rounded-md border px-3"
        />
        <Button type="submit" disabled={isSending}>
          {button}
        </Button>
      </div>
      {problem && (
        <p id={`${id}-problem`} role="alert" className="text-danger text-sm">
          {problem}
        </p>
      )}
    </form>
  );
}
