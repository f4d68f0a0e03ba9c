'use server';

import { redirect } from 'next/navigation';
import { closeSession } from '@/src/web/action';

export async function signOutAction(): Promise<void> {
  await closeSession();
  redirect('/sign-in');
}
