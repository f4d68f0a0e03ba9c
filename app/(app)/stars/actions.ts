'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { z } from 'zod';
import { draftNewStar, draftNextVersion, editDraft } from '@/src/stars/draft-star';
import { publishStar, retireStar } from '@/src/stars/publish-star';
import { newStar, starDraft } from '@/src/stars/star-draft-schema';
import { formAction } from '@/src/web/action';
import type { FormState } from '@/src/web/form-state';
import { pageActor, pageEm } from '@/src/web/page';
import { parseForm } from '@/src/web/parse-form';

/** Text of a form as the number it writes; nothing stays nothing. */
const typed = z
  .string()
  .trim()
  .transform((text) => (text === '' ? undefined : Number(text)));
const numbers = { massSun: typed, luminositySun: typed, teffK: typed, radiusSun: typed };

const draftForm = z
  .looseObject(numbers)
  .transform((fields): unknown => fields)
  .pipe(starDraft);
const newStarForm = z
  .looseObject(numbers)
  .transform((fields): unknown => fields)
  .pipe(newStar);
const versionForm = z.object({ id: z.uuid() });
const slugForm = z.object({ slug: z.string().min(1).max(64) });

const fieldsOf = (form: FormData, ...left: string[]): FormData => {
  const kept = new FormData();
  for (const [name, value] of form) if (!name.startsWith('$') && !left.includes(name)) kept.append(name, value);
  return kept;
};

export async function draftNewStarAction(_state: FormState, form: FormData): Promise<FormState> {
  return formAction(form, async () => {
    const { slug } = await draftNewStar(await pageEm(), await pageActor(), parseForm(newStarForm, fieldsOf(form)));
    redirect(`/stars/${slug}`);
  });
}

export async function draftNextVersionAction(_state: FormState, form: FormData): Promise<FormState> {
  return formAction(form, async () => {
    const { slug } = parseForm(slugForm, form);
    await draftNextVersion(await pageEm(), await pageActor(), slug);
    revalidatePath(`/stars/${slug}`);
    return {};
  });
}

export type EditState = FormState & { saved?: boolean };

export async function editDraftAction(_state: EditState, form: FormData): Promise<EditState> {
  return formAction<EditState>(form, async () => {
    const { id } = parseForm(versionForm, form);
    await editDraft(await pageEm(), await pageActor(), id, parseForm(draftForm, fieldsOf(form, 'id')));
    revalidatePath('/stars', 'layout');
    return { saved: true };
  });
}

export async function publishStarAction(_state: FormState, form: FormData): Promise<FormState> {
  return formAction(form, async () => {
    await publishStar(await pageEm(), await pageActor(), parseForm(versionForm, form).id);
    revalidatePath('/stars', 'layout');
    return {};
  });
}

export async function retireStarAction(_state: FormState, form: FormData): Promise<FormState> {
  return formAction(form, async () => {
    await retireStar(await pageEm(), await pageActor(), parseForm(versionForm, form).id);
    revalidatePath('/stars', 'layout');
    return {};
  });
}
