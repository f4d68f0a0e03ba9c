'use client';

import { useActionState } from 'react';
import { Button } from '@/src/ui/button';
import { Notice } from '@/src/ui/notice';
import { PasswordField } from '@/src/ui/password-field';
import { resetPasswordAction } from './actions';

export function ResetForm({ secret }: { secret: string }) {
  const [state, send, isSending] = useActionState(resetPasswordAction, {});
  return (
    <form action={send} className="grid gap-5">
      <input type="hidden" name="secret" value={secret} />
      <div aria-live="polite">{state.message && <Notice kind="danger">{state.message}</Notice>}</div>
      <PasswordField
        label="New password"
        autoComplete="new-password"
        hint="At least 12 characters: a short sentence works well."
        problem={state.problems?.password}
      />
      <div>
        <Button type="submit" variant="primary" disabled={isSending}>
          Set the password
        </Button>
      </div>
      <p className="text-muted text-sm">All sessions of the account end; then sign in with the new password.</p>
    </form>
  );
}
