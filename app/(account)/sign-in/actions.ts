'use server';

import { redirect } from 'next/navigation';
import { forkEm } from '@/src/db';
import { signIn, signInInput } from '@/src/people/sign-in';
import { formAction, openSession } from '@/src/web/action';
import type { FormState } from '@/src/web/form-state';
import { nextAddress } from '@/src/web/next-address';
import { parseForm } from '@/src/web/parse-form';
import { countFailure, refuseAbove } from '@/src/web/rate-limit';

export async function signInAction(_state: FormState, form: FormData): Promise<FormState> {
  return formAction(form, async () => {
    const input = parseForm(signInInput, form);
    await refuseAbove('signInFailure', input.email);
    const who = await countFailure('signInFailure', input.email, signIn(await forkEm(), input));
    await openSession(who.personId, who.groupId);
    redirect(nextAddress(form.get('next')));
  });
}
