'use client';

import { useActionState } from 'react';
import { Button } from '@/src/ui/button';
import { FormField } from '@/src/ui/form-field';
import { Notice } from '@/src/ui/notice';
import { roleWords } from '@/src/ui/role-words';
import { inviteAction, type InviteState } from './actions';

const roles = ['researcher', 'student', 'pi'] as const;

export function InviteForm() {
  const [state, send, isSending] = useActionState<InviteState, FormData>(inviteAction, {});
  return (
    <form action={send} className="grid max-w-2xl gap-4">
      <div aria-live="polite">
        {state.message && <Notice kind="danger">{state.message}</Notice>}
        {state.link && (
          <Notice kind="ok" title={`Send this link to ${state.email}: it is not shown again`}>
            <p className="font-mono text-sm break-all select-all">{state.link}</p>
            <p className="text-sm">It works once, for that address, for 14 days.</p>
          </Notice>
        )}
      </div>
      <div className="grid gap-4 sm:grid-cols-[minmax(0,1fr)_14rem]">
        <FormField
          name="email"
          label="E-mail address"
          type="email"
          autoComplete="off"
          required
          defaultValue={state.values?.email}
          problem={state.problems?.email}
        />
        <div className="grid content-start gap-1">
          <label htmlFor="invite-role" className="text-sm font-medium">
            Role
          </label>
          <select id="invite-role" name="role" className="border-field bg-panel h-11 rounded-md border px-3">
            {roles.map((role) => (
              <option key={role} value={role}>
                {roleWords[role]}
              </option>
            ))}
          </select>
        </div>
      </div>
      <div>
        <Button type="submit" variant="primary" disabled={isSending}>
          Make an invitation
        </Button>
      </div>
    </form>
  );
}
