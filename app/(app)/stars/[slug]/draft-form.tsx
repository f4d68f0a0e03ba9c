'use client';

import { useActionState } from 'react';
import { Button } from '@/src/ui/button';
import { Notice } from '@/src/ui/notice';
import { editDraftAction, type EditState } from '../actions';
import { StarFields, type StarValues } from '../star-fields';

export function DraftForm({ id, values }: { id: string; values: StarValues }) {
  const [state, send, isSending] = useActionState<EditState, FormData>(editDraftAction, {});
  return (
    <form action={send} className="grid max-w-3xl gap-5">
      <input type="hidden" name="id" value={id} />
      <div aria-live="polite">
        {state.message && <Notice kind="danger">{state.message}</Notice>}
        {state.saved && <Notice kind="ok">The draft is saved.</Notice>}
      </div>
      <StarFields values={values} state={state} />
      <div>
        <Button type="submit" disabled={isSending}>
          Save the draft
        </Button>
      </div>
    </form>
  );
}
