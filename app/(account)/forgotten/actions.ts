'use server';

import { forkEm } from '@/src/db';
import { askForReset, forgottenInput } from '@/src/people/reset-password';
import { formAction } from '@/src/web/action';
import type { FormState } from '@/src/web/form-state';
import { parseForm } from '@/src/web/parse-form';
import { publicUrl } from '@/src/web/public-url';
import { countAgainst } from '@/src/web/rate-limit';

export type ForgottenState = FormState & { asked?: boolean };

export async function forgottenAction(_state: ForgottenState, form: FormData): Promise<ForgottenState> {
  return formAction<ForgottenState>(form, async () => {
    const input = parseForm(forgottenInput, form);
    await countAgainst('accountMail', input.email);
    await askForReset(await forkEm(), input, publicUrl);
    return { asked: true };
  });
}
