'use server';

import { redirect } from 'next/navigation';
import { forkEm } from '@/src/db';
import { signUp, signUpInput } from '@/src/people/sign-up';
import { formAction, openSession } from '@/src/web/action';
import type { FormState } from '@/src/web/form-state';
import { parseForm } from '@/src/web/parse-form';
import { publicUrl } from '@/src/web/public-url';
import { countAgainst } from '@/src/web/rate-limit';

export async function signUpAction(_state: FormState, form: FormData): Promise<FormState> {
  return formAction(form, async () => {
    const input = parseForm(signUpInput, form);
    await countAgainst('signUp', input.email);
    const who = await signUp(await forkEm(), input, publicUrl);
    await openSession(who.personId, who.groupId);
    redirect('/home');
  });
}
