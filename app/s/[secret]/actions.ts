'use server';

import { cookies } from 'next/headers';
import { redirect } from 'next/navigation';
import { z } from 'zod';
import { Refusal } from '@/src/errors';
import { openShare, unlock } from '@/src/sharing/open-share';
import { formAction } from '@/src/web/action';
import type { FormState } from '@/src/web/form-state';
import { pageEm } from '@/src/web/page';
import { parseForm } from '@/src/web/parse-form';
import { countAgainst } from '@/src/web/rate-limit';

const passphraseForm = z.object({
  secret: z.string().min(1).max(100),
  passphrase: z.string().min(1, 'is needed').max(200),
});
const halfADayS = 43_200;

export async function unlockAction(_state: FormState, form: FormData): Promise<FormState> {
  return formAction(form, async () => {
    const { secret, passphrase } = parseForm(passphraseForm, form);
    const share = await openShare(await pageEm(), secret);
    await countAgainst('passphrase', share.id);
    const unlocked = await unlock(share, passphrase);
    if (!unlocked) throw new Refusal('forbidden', 'This is not the passphrase.');
    (await cookies()).set(unlocked.name, unlocked.proof, {
      httpOnly: true,
      secure: true,
      sameSite: 'strict',
      path: '/',
      maxAge: halfADayS,
    });
    redirect(`/s/${encodeURIComponent(secret)}`);
  });
}
