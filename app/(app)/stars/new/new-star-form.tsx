'use client';

import { useActionState } from 'react';
import { Button } from '@/src/ui/button';
import { FormField } from '@/src/ui/form-field';
import { Notice } from '@/src/ui/notice';
import { draftNewStarAction } from '../actions';
import { StarFields } from '../star-fields';

const owners = { group: 'the group alone', everybody: 'everybody' };

export function NewStarForm({ mayOwn }: { mayOwn: readonly (keyof typeof owners)[] }) {
  const [state, send, isSending] = useActionState(draftNewStarAction, {});
  return (
    <form action={send} className="grid max-w-3xl gap-5">
      <div aria-live="polite">{state.message && <Notice kind="danger">{state.message}</Notice>}</div>
      <div className="grid gap-4 sm:grid-cols-2">
        <FormField
          name="slug"
          label="Short name"
          hint="For catalogues and scripts, such as my_star"
          required
          autoComplete="off"
          defaultValue={state.values?.slug}
          problem={state.problems?.slug}
        />
        <div className="grid content-start gap-1">
          <label htmlFor="owner" className="text-sm font-medium">
            Seen by
          </label>
          <select id="owner" name="owner" className="border-field bg-panel h-11 rounded-md border px-3">
            {mayOwn.map((owner) => (
              <option key={owner} value={owner}>
                {owners[owner]}
              </option>
            ))}
          </select>
        </div>
      </div>
      <StarFields values={{}} state={state} />
      <div>
        <Button type="submit" variant="primary" disabled={isSending}>
          Save as a draft
        </Button>
      </div>
    </form>
  );
}
