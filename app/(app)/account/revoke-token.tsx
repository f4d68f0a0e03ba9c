'use client';

import { useActionState } from 'react';
import { Button } from '@/src/ui/button';
import { revokeTokenAction } from './actions';

export function RevokeToken({ id, name }: { id: string; name: string }) {
  const [state, send, isSending] = useActionState(revokeTokenAction, {});
  return (
    <form action={send}>
      <input type="hidden" name="id" value={id} />
      <Button type="submit" size="small" variant="danger" disabled={isSending} aria-label={`Revoke the token ${name}`}>
        Revoke
      </Button>
      {state.message && (
        <p role="alert" className="text-danger text-sm">
          {state.message}
        </p>
      )}
    </form>
  );
}
