import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { nextAddress } from '@/src/web/next-address';
import { optionalActor } from '@/src/web/page';
import { SignInForm } from './sign-in-form';

export const metadata: Metadata = { title: 'Sign in' };

type Props = { searchParams: Promise<{ next?: string | string[] }> };

export default async function SignInPage({ searchParams }: Props) {
  const next = nextAddress((await searchParams).next);
  if (await optionalActor()) redirect(next);
  return (
    <>
      <h1 className="mb-6 text-3xl">Sign in</h1>
      <SignInForm next={next} />
    </>
  );
}
