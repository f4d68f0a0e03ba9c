import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { optionalActor } from '@/src/web/page';
import { SignUpForm } from './sign-up-form';

export const metadata: Metadata = { title: 'Sign up' };

export default async function SignUpPage() {
  if (await optionalActor()) redirect('/home');
  return (
    <>
      <h1 className="mb-6 text-3xl">Sign up</h1>
      <SignUpForm />
    </>
  );
}
