'use server';

import { revalidatePath } from 'next/cache';
import { z } from 'zod';
import { changePassword, changePasswordInput } from '@/src/people/change-password';
import { endOwnSession } from '@/src/people/own-sessions';
import { makeToken, revokeToken } from '@/src/people/tokens';
import { sendVerificationAgain } from '@/src/people/verify-address';
import { formAction, openSession } from '@/src/web/action';
import type { FormState } from '@/src/web/form-state';
import { pageActor, pageEm } from '@/src/web/page';
import { parseForm } from '@/src/web/parse-form';
import { publicUrl } from '@/src/web/public-url';
import { countAgainst, countFailure, refuseAbove } from '@/src/web/rate-limit';

const tokenForm = z.object({
  name: z.string().trim().min(1, 'is needed').max(100),
  access: z.enum(['read', 'write']),
  expiresInDays: z.coerce.number().int().min(1, 'must be 1 to 365').max(365, 'must be 1 to 365'),
});

export type TokenState = FormState & { token?: string };

export async function makeTokenAction(_state: TokenState, form: FormData): Promise<TokenState> {
  return formAction<TokenState>(form, async () => {
    const actor = await pageActor();
    const { name, access, expiresInDays } = parseForm(tokenForm, form);
    await countAgainst('tokens', actor.personId);
    const { token } = await makeToken(await pageEm(), actor, {
      name,
      scopes: access === 'write' ? ['read', 'write'] : ['read'],
      expiresInDays,
    });
    revalidatePath('/account');
    return { token };
  });
}

export async function revokeTokenAction(_state: FormState, form: FormData): Promise<FormState> {
  return formAction(form, async () => {
    const actor = await pageActor();
    const { id } = parseForm(z.object({ id: z.uuid() }), form);
    await revokeToken(await pageEm(), actor, id);
    revalidatePath('/account');
    return {};
  });
}

export type PasswordState = FormState & { changed?: boolean };

export async function changePasswordAction(_state: PasswordState, form: FormData): Promise<PasswordState> {
  return formAction<PasswordState>(form, async () => {
    const actor = await pageActor();
    await refuseAbove('signInFailure', actor.email);
    const input = parseForm(changePasswordInput, form);
    await countFailure('signInFailure', actor.email, changePassword(await pageEm(), actor, input));
    await openSession(actor.personId, actor.groupId);
    revalidatePath('/account');
    return { changed: true };
  });
}

export async function endSessionAction(_state: FormState, form: FormData): Promise<FormState> {
  return formAction(form, async () => {
    const { id } = parseForm(z.object({ id: z.string().regex(/^[0-9a-f]{64}$/) }), form);
    await endOwnSession(await pageEm(), await pageActor(), id);
    revalidatePath('/account');
    return {};
  });
}

export async function sendVerificationAction(_state: FormState, form: FormData): Promise<FormState> {
  return formAction(form, async () => {
    const actor = await pageActor();
    await countAgainst('accountMail', actor.email);
    await sendVerificationAgain(await pageEm(), actor, publicUrl);
    return { message: 'The message is on its way.' };
  });
}
