import Link from 'next/link';
import type { ReactNode } from 'react';
import type { Actor } from '@/src/access/actor';
import { may } from '@/src/access/policy';
import { Navigation, NavigationMenu } from '@/src/ui/navigation';
import { PersonMenu } from '@/src/ui/person-menu';
import { roleWords } from '@/src/ui/role-words';
import { ThemeSwitch } from '@/src/ui/theme-switch';
import { Wordmark } from '@/src/ui/wordmark';
import { pageActor } from '@/src/web/page';
import { signOutAction } from './sign-out';

const places = [
  { href: '/home', label: 'Home' },
  { href: '/catalogues', label: 'Catalogues' },
  { href: '/runs', label: 'Runs' },
  { href: '/calculator', label: 'Calculator' },
  { href: '/stars', label: 'Stars' },
  { href: '/materials', label: 'Materials' },
  { href: '/methods', label: 'Methods' },
];

export default async function ShellLayout({ children }: { children: ReactNode }) {
  const actor = await pageActor();
  return (
    <div className="mx-auto max-w-[88rem] px-4 sm:px-8">
      <header className="border-line mb-8 border-b pt-4">
        <div className="flex items-center justify-between gap-4">
          <Link href="/home" aria-label="Chaffline, home">
            <Wordmark />
          </Link>
          <div className="flex items-center gap-1">
            <ThemeSwitch />
            <PersonMenu
              name={actor.name}
              groupName={actor.groupName}
              role={roleOf(actor)}
              links={linksOf(actor)}
              signOut={signOutAction}
            />
          </div>
        </div>
        <Navigation items={places} />
        <NavigationMenu items={places} />
      </header>
      <main id="content" className="min-w-0 pb-16">
        {children}
      </main>
      <footer className="border-line text-muted border-t py-6 text-sm">
        Research estimates for idealised grains, not a spacecraft impact-hazard assessment.{' '}
        <Link href="/methods#cautions" className="prose-link">
          What to bear in mind
        </Link>
      </footer>
    </div>
  );
}

function roleOf({ role, platformRole }: Actor): string {
  return roleWords[role ?? (platformRole === 'admin' ? 'admin' : 'groupless')];
}

const linksOf = (actor: Actor) => [
  { href: '/group', label: 'Group and people' },
  ...(may(actor, 'changes.read') ? [{ href: '/changes', label: 'Record of changes' }] : []),
  { href: '/account', label: 'Account and access tokens' },
  { href: '/roles', label: 'What each role may do' },
];
