'use server';

import { redirect } from 'next/navigation';
import { z } from 'zod';
import { acceptAsNewPerson, acceptInvitation, invitedPersonInput } from '@/src/people/accept-invitation';
import { formAction, openSession } from '@/src/web/action';
import type { FormState } from '@/src/web/form-state';
import { pageActor, pageEm } from '@/src/web/page';
import { parseForm } from '@/src/web/parse-form';
import { countAgainst } from '@/src/web/rate-limit';

const link = z.object({ secret: z.string().min(1).max(100) });

/** A new membership begins a new session in that group. */
export async function acceptInvitationAction(_state: FormState, form: FormData): Promise<FormState> {
  return formAction(form, async () => {
    const actor = await pageActor();
    const { secret } = parseForm(link, form);
    const joined = await acceptInvitation(await pageEm(), actor, secret);
    await openSession(joined.personId, joined.groupId);
    redirect('/home');
  });
}

export async function acceptAsNewPersonAction(_state: FormState, form: FormData): Promise<FormState> {
  return formAction(form, async () => {
    const { secret, ...person } = parseForm(link.extend(invitedPersonInput.shape), form);
    await countAgainst('signUp', secret);
    const joined = await acceptAsNewPerson(await pageEm(), person, secret);
    await openSession(joined.personId, joined.groupId);
    redirect('/home');
  });
}
