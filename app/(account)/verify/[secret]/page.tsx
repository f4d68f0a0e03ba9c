import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { isOpenLink } from '@/src/people/account-links';
import { ActionButton } from '@/src/ui/action-button';
import { pageEm } from '@/src/web/page';
import { verifyAddressAction } from './actions';

export const metadata: Metadata = { title: 'Confirm the address', robots: 'noindex', referrer: 'no-referrer' };

/** Opening the link uses nothing up: mail programs open links by themselves. */
export default async function VerifyPage({ params }: { params: Promise<{ secret: string }> }) {
  const { secret } = await params;
  if (!(await isOpenLink(await pageEm(), secret, 'verify'))) notFound();
  return (
    <div className="grid gap-6">
      <h1 className="text-3xl">Confirm your e-mail address</h1>
      <div>
        <ActionButton action={verifyAddressAction} fields={{ secret }} variant="primary">
          It is my address
        </ActionButton>
      </div>
    </div>
  );
}
