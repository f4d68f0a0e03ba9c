'use server';

import { redirect } from 'next/navigation';
import { Refusal } from '@/src/errors';
import { requestRun } from '@/src/runs/request-run';
import { runRequest } from '@/src/runs/request-schema';
import { formAction } from '@/src/web/action';
import type { FormState } from '@/src/web/form-state';
import { pageActor, pageEm } from '@/src/web/page';
import { refusalOfZod } from '@/src/web/problem';
import { countAgainst } from '@/src/web/rate-limit';

/** The form sends the request as JSON in the field `request`: it is nested as in the API. */
export async function requestRunAction(_state: FormState, form: FormData): Promise<FormState> {
  return formAction(form, async () => {
    const actor = await pageActor();
    await countAgainst('run', actor.personId);
    const parsed = runRequest.safeParse(jsonField(form.get('request')));
    if (!parsed.success) throw refusalOfZod(parsed.error, 'form');
    const run = await requestRun(await pageEm(), actor, parsed.data);
    redirect(`/runs/${run.id}`);
  });
}

function jsonField(value: FormDataEntryValue | null): unknown {
  try {
    return JSON.parse(typeof value === 'string' ? value : '');
  } catch {
    throw new Refusal('invalid', 'The form could not be read. Reload the page and try again.');
  }
}
