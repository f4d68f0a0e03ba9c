'use client';

import { Menu } from 'lucide-react';
import Link from 'next/link';
import { usePathname } from 'next/navigation';
import { Disclosure } from './disclosure';

export type NavigationItem = { href: string; label: string };
type Props = { items: readonly NavigationItem[] };

const isAt = (path: string, href: string) => path === href || path.startsWith(`${href}/`);

/** The places in a row; on narrow screens `NavigationMenu` stands in for it. */
export function Navigation({ items }: Props) {
  const path = usePathname();
  return (
    <nav aria-label="Main" className="-mx-2.5 max-md:hidden">
      <ul className="flex gap-1">
        {items.map(({ href, label }) => (
          <li key={href}>
            <Link
              href={href}
              aria-current={isAt(path, href) ? 'page' : undefined}
              className="hover:border-field aria-[current]:border-chaff inline-flex min-h-10 items-center border-b-2 border-transparent px-2.5 aria-[current]:font-medium"
            >
              {label}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}

export function NavigationMenu({ items }: Props) {
  const path = usePathname();
  return (
    <nav aria-label="Main, as a menu" className="md:hidden">
      <Disclosure
        summaryClass="hover:bg-line/50 -ml-2 inline-flex min-h-11 items-center gap-2 rounded-md px-2"
        summary={
          <>
            <Menu className="size-5" aria-hidden="true" />
            <span className="sr-only">Menu: </span>
            {items.find(({ href }) => isAt(path, href))?.label ?? 'Menu'}
          </>
        }
      >
        <ul className="bg-panel border-line absolute left-0 z-30 mt-1 w-60 rounded-lg border p-2 shadow-lg">
          {items.map(({ href, label }) => (
            <li key={href}>
              <Link
                href={href}
                aria-current={isAt(path, href) ? 'page' : undefined}
                className="hover:bg-line/50 aria-[current]:border-chaff flex min-h-11 items-center border-l-2 border-transparent px-3 aria-[current]:font-medium"
              >
                {label}
              </Link>
            </li>
          ))}
        </ul>
      </Disclosure>
    </nav>
  );
}
