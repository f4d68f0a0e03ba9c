'use client';

import { useActionState } from 'react';
import type { MemberItem } from '@/src/people/find-group';
import { Button } from '@/src/ui/button';
import { roleWords } from '@/src/ui/role-words';
import { changeRoleAction } from './actions';

const roles = ['pi', 'researcher', 'student'] as const;

export function RoleForm({ member: { personId, name, role } }: { member: MemberItem }) {
  const [state, send, isSending] = useActionState(changeRoleAction, {});
  return (
    <form action={send} className="flex flex-wrap items-center gap-2">
      <input type="hidden" name="personId" value={personId} />
      <select
        key={role}
        name="role"
        defaultValue={role}
        aria-label={`Role of ${name}`}
        className="border-field bg-panel h-9 rounded-md border px-2"
      >
        {roles.map((choice) => (
          <option key={choice} value={choice}>
            {roleWords[choice]}
          </option>
        ))}
      </select>
      <Button type="submit" size="small" variant="quiet" disabled={isSending} aria-label={`Set the role of ${name}`}>
        Set
      </Button>
      {state.message && (
        <p role="alert" className="text-danger basis-full text-sm">
          {state.message}
        </p>
      )}
    </form>
  );
}
