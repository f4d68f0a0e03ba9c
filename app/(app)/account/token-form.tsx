'use client';

import { useActionState } from 'react';
import { Button } from '@/src/ui/button';
import { FormField } from '@/src/ui/form-field';
import { Notice } from '@/src/ui/notice';
import { makeTokenAction, type TokenState } from './actions';

export function TokenForm() {
  const [state, send, isSending] = useActionState<TokenState, FormData>(makeTokenAction, {});
  return (
    <form action={send} className="grid max-w-xl gap-4">
      <div aria-live="polite">
        {state.message && <Notice kind="danger">{state.message}</Notice>}
        {state.token && (
          <Notice kind="ok" title="Copy the token now: it is not shown again">
            <p className="font-mono text-sm break-all select-all">{state.token}</p>
          </Notice>
        )}
      </div>
      <FormField
        name="name"
        label="What the token is for"
        required
        defaultValue={state.values?.name}
        problem={state.problems?.name}
      />
      <div className="grid gap-4 sm:grid-cols-2">
        <div className="grid content-start gap-1">
          <label htmlFor="access" className="text-sm font-medium">
            What it may do
          </label>
          <select id="access" name="access" className="border-field bg-panel h-11 rounded-md border px-3">
            <option value="read">read</option>
            <option value="write">read and change</option>
          </select>
        </div>
        <FormField
          name="expiresInDays"
          label="Valid for (days)"
          inputMode="numeric"
          defaultValue={state.values?.expiresInDays ?? '90'}
          problem={state.problems?.expiresInDays}
        />
      </div>
      <div>
        <Button type="submit" variant="primary" disabled={isSending}>
          Make a token
        </Button>
      </div>
    </form>
  );
}
