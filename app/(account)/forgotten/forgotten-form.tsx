'use client';

import { useActionState } from 'react';
import { Button } from '@/src/ui/button';
import { FormField } from '@/src/ui/form-field';
import { Notice } from '@/src/ui/notice';
import { forgottenAction, type ForgottenState } from './actions';

export function ForgottenForm() {
  const [state, send, isSending] = useActionState<ForgottenState, FormData>(forgottenAction, {});
  return (
    <form action={send} className="grid gap-5">
      <div aria-live="polite">
        {state.message && <Notice kind="danger">{state.message}</Notice>}
        {state.asked && (
          <Notice kind="info" title="Look into your e-mail">
            If there is an account with this address, a link to choose a new password is on its way. It works for one
            hour.
          </Notice>
        )}
      </div>
      <FormField
        name="email"
        label="E-mail address"
        type="email"
        autoComplete="username"
        required
        defaultValue={state.values?.email}
        problem={state.problems?.email}
      />
      <div>
        <Button type="submit" variant="primary" disabled={isSending}>
          Send me a link
        </Button>
      </div>
    </form>
  );
}
