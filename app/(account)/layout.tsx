import Link from 'next/link';
import type { ReactNode } from 'react';
import { ThemeSwitch } from '@/src/ui/theme-switch';
import { Wordmark } from '@/src/ui/wordmark';

export default function AccountLayout({ children }: { children: ReactNode }) {
  return (
    <div className="mx-auto grid max-w-md gap-10 px-5 py-8">
      <header className="flex items-center justify-between">
        <Link href="/" aria-label="Chaffline, front page">
          <Wordmark />
        </Link>
        <ThemeSwitch />
      </header>
      <main id="content">{children}</main>
    </div>
  );
}
