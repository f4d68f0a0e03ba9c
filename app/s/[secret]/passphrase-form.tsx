'use client';

import { useActionState } from 'react';
import { Button } from '@/src/ui/button';
import { FormField } from '@/src/ui/form-field';
import { Notice } from '@/src/ui/notice';
import { unlockAction } from './actions';

export function PassphraseForm({ secret }: { secret: string }) {
  const [state, send, isSending] = useActionState(unlockAction, {});
  return (
    <form action={send} className="grid max-w-md gap-4">
      <input type="hidden" name="secret" value={secret} />
      <div aria-live="polite">{state.message && <Notice kind="danger">{state.message}</Notice>}</div>
      <FormField
        name="passphrase"
        label="Passphrase"
        type="password"
        autoComplete="off"
        required
        problem={state.problems?.passphrase}
      />
      <div>
        <Button type="submit" variant="primary" disabled={isSending}>
          Show the run
        </Button>
      </div>
    </form>
  );
}
