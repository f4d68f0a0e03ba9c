import type { Metadata } from 'next';
import { cookies } from 'next/headers';
import Link from 'next/link';
import { countView, isUnlocked, openShare, sharedItem } from '@/src/sharing/open-share';
import { PageHeader } from '@/src/ui/page-header';
import { SharedRun } from '@/src/ui/shared-run';
import { ThemeSwitch } from '@/src/ui/theme-switch';
import { Wordmark } from '@/src/ui/wordmark';
import { orNotFound, pageEm } from '@/src/web/page';
import { PassphraseForm } from './passphrase-form';

export const metadata: Metadata = {
  title: 'A shared run',
  robots: { index: false, follow: false },
  referrer: 'no-referrer',
};

export default async function SharedPage({ params }: { params: Promise<{ secret: string }> }) {
  const { secret } = await params;
  const em = await pageEm();
  const share = await orNotFound(openShare(em, secret));
  const jar = await cookies();
  const unlocked = isUnlocked(share, (name) => jar.get(name)?.value);
  if (unlocked) await countView(em, share);
  const run = sharedItem(share);
  return (
    <div className="mx-auto max-w-[88rem] px-4 sm:px-8">
      <header className="border-line mb-8 flex items-center justify-between gap-4 border-b py-4">
        <Link href="/" aria-label="Chaffline, front page">
          <Wordmark />
        </Link>
        <ThemeSwitch />
      </header>
      <main id="content" className="min-w-0 pb-16">
        {unlocked ? (
          <>
            <PageHeader title={run.name} subtitle="A run that was shared with you: to read, not to change." />
            <SharedRun run={run} base={`/api/s/${secret}`} mayDownload={share.mayDownload} />
          </>
        ) : (
          <>
            <PageHeader title="A shared run" subtitle="Whoever shared it gave it a passphrase." />
            <PassphraseForm secret={secret} />
          </>
        )}
      </main>
    </div>
  );
}
