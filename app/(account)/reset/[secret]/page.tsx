import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { isOpenLink } from '@/src/people/account-links';
import { pageEm } from '@/src/web/page';
import { ResetForm } from './reset-form';

export const metadata: Metadata = { title: 'New password', robots: 'noindex', referrer: 'no-referrer' };

/** Opening the link uses nothing up. */
export default async function ResetPage({ params }: { params: Promise<{ secret: string }> }) {
  const { secret } = await params;
  if (!(await isOpenLink(await pageEm(), secret, 'reset'))) notFound();
  return (
    <>
      <h1 className="mb-6 text-3xl">Choose a new password</h1>
      <ResetForm secret={secret} />
    </>
  );
}
