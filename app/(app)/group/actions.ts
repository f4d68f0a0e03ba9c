'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { z } from 'zod';
import { groupRoles } from '@/entities/membership';
import { changeRole, leaveGroup, removeMember } from '@/src/people/change-members';
import { invite, inviteInput, revokeInvitation } from '@/src/people/invite';
import { createGroup, groupNameInput, groupToEnter, renameGroup } from '@/src/people/own-groups';
import { formAction, openSession } from '@/src/web/action';
import type { FormState } from '@/src/web/form-state';
import { pageActor, pageEm } from '@/src/web/page';
import { parseForm } from '@/src/web/parse-form';
import { publicUrl } from '@/src/web/public-url';
import { countAgainst } from '@/src/web/rate-limit';

export type InviteState = FormState & { link?: string; email?: string };

export async function inviteAction(_state: InviteState, form: FormData): Promise<InviteState> {
  return formAction<InviteState>(form, async () => {
    const actor = await pageActor();
    const input = parseForm(inviteInput, form);
    await countAgainst('invitation', actor.personId);
    const { secret } = await invite(await pageEm(), actor, input, publicUrl);
    revalidatePath('/group');
    return { link: publicUrl(`/invitation/${secret}`), email: input.email };
  });
}

export async function revokeInvitationAction(_state: FormState, form: FormData): Promise<FormState> {
  return formAction(form, async () => {
    const { id } = parseForm(z.object({ id: z.uuid() }), form);
    await revokeInvitation(await pageEm(), await pageActor(), id);
    revalidatePath('/group');
    return {};
  });
}

export async function changeRoleAction(_state: FormState, form: FormData): Promise<FormState> {
  return formAction(form, async () => {
    const { personId, role } = parseForm(z.object({ personId: z.uuid(), role: z.enum(groupRoles) }), form);
    await changeRole(await pageEm(), await pageActor(), personId, role);
    revalidatePath('/group');
    return {};
  });
}

export async function removeMemberAction(_state: FormState, form: FormData): Promise<FormState> {
  return formAction(form, async () => {
    const { personId } = parseForm(z.object({ personId: z.uuid() }), form);
    await removeMember(await pageEm(), await pageActor(), personId);
    revalidatePath('/group');
    return {};
  });
}

export async function renameGroupAction(_state: FormState, form: FormData): Promise<FormState> {
  return formAction(form, async () => {
    await renameGroup(await pageEm(), await pageActor(), parseForm(groupNameInput, form));
    revalidatePath('/', 'layout');
    return {};
  });
}

/** A session works in one group: entering another begins a new one. */
export async function createGroupAction(_state: FormState, form: FormData): Promise<FormState> {
  return formAction(form, async () => {
    const actor = await pageActor();
    const input = parseForm(groupNameInput, form);
    await countAgainst('invitation', actor.personId);
    const { groupId } = await createGroup(await pageEm(), actor, input);
    await openSession(actor.personId, groupId);
    redirect('/home');
  });
}

export async function enterGroupAction(_state: FormState, form: FormData): Promise<FormState> {
  return formAction(form, async () => {
    const actor = await pageActor();
    const { groupId } = parseForm(z.object({ groupId: z.uuid() }), form);
    await groupToEnter(await pageEm(), actor, groupId);
    await openSession(actor.personId, groupId);
    redirect('/home');
  });
}

export async function leaveGroupAction(_state: FormState, form: FormData): Promise<FormState> {
  return formAction(form, async () => {
    const actor = await pageActor();
    await leaveGroup(await pageEm(), actor);
    await openSession(actor.personId, null);
    redirect('/home');
  });
}
