'use server';

import { redirect } from 'next/navigation';
import { z } from 'zod';
import { forkEm } from '@/src/db';
import { newPasswordInput, resetPassword } from '@/src/people/reset-password';
import { formAction } from '@/src/web/action';
import type { FormState } from '@/src/web/form-state';
import { parseForm } from '@/src/web/parse-form';

export async function resetPasswordAction(_state: FormState, form: FormData): Promise<FormState> {
  return formAction(form, async () => {
    const { secret, ...input } = parseForm(newPasswordInput.extend({ secret: z.string().min(1).max(100) }), form);
    await resetPassword(await forkEm(), secret, input);
    redirect('/sign-in');
  });
}
