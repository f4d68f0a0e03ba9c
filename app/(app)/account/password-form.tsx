'use client';

import { useActionState } from 'react';
import { Button } from '@/src/ui/button';
import { FormField } from '@/src/ui/form-field';
import { Notice } from '@/src/ui/notice';
import { PasswordField } from '@/src/ui/password-field';
import { changePasswordAction, type PasswordState } from './actions';

export function PasswordForm() {
  const [state, send, isSending] = useActionState<PasswordState, FormData>(changePasswordAction, {});
  return (
    <form action={send} className="grid max-w-md gap-4">
      <div aria-live="polite">
        {state.message && <Notice kind="danger">{state.message}</Notice>}
        {state.changed && <Notice kind="ok">The password is changed. All other sessions have ended.</Notice>}
      </div>
      <FormField
        name="oldPassword"
        label="Present password"
        type="password"
        autoComplete="current-password"
        required
        problem={state.problems?.oldPassword}
      />
      <PasswordField
        label="New password"
        autoComplete="new-password"
        hint="At least 12 characters: a short sentence works well."
        problem={state.problems?.password}
      />
      <div>
        <Button type="submit" disabled={isSending}>
          Change the password
        </Button>
      </div>
    </form>
  );
}
