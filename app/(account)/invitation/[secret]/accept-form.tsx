'use client';

import { useActionState } from 'react';
import { Button } from '@/src/ui/button';
import { Notice } from '@/src/ui/notice';
import { acceptInvitationAction } from './actions';

export function AcceptForm({ secret }: { secret: string }) {
  const [state, send, isSending] = useActionState(acceptInvitationAction, {});
  return (
    <form action={send} className="grid gap-4">
      <input type="hidden" name="secret" value={secret} />
      <div aria-live="polite">{state.message && <Notice kind="danger">{state.message}</Notice>}</div>
      <div>
        <Button type="submit" variant="primary" disabled={isSending}>
          Join the group
        </Button>
      </div>
    </form>
  );
}
