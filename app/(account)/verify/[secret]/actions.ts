'use server';

import { redirect } from 'next/navigation';
import { z } from 'zod';
import { forkEm } from '@/src/db';
import { verifyAddress } from '@/src/people/verify-address';
import { formAction } from '@/src/web/action';
import type { FormState } from '@/src/web/form-state';
import { parseForm } from '@/src/web/parse-form';

export async function verifyAddressAction(_state: FormState, form: FormData): Promise<FormState> {
  return formAction(form, async () => {
    const { secret } = parseForm(z.object({ secret: z.string().min(1).max(100) }), form);
    await verifyAddress(await forkEm(), secret);
    redirect('/home');
  });
}
