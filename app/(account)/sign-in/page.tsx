import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { optionalActor } from '@/src/web/page';
import { SignInForm } from './sign-in-form';

export const metadata: Metadata = { title: 'Sign in' };

export default async function SignInPage() {
  if (await optionalActor()) redirect('/home');
  return (
    <>
      <h1 className="mb-6 text-3xl">Sign in</h1>
      <SignInForm />
    </>
  );
}
