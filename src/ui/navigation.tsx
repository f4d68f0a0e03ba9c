'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';

export type NavigationItem = { href: string; label: string };

export function Navigation({ items }: { items: readonly NavigationItem[] }) {
  const path = usePathname();
  return (
    <nav aria-label="Main" className="-mx-2 overflow-x-auto">
      <ul className="flex min-w-max gap-1">
        {items.map(({ href, label }) => {
          const isHere = path === href || path.startsWith(`${href}/`);
          return (
            <li key={href}>
              <Link
                href={href}
                aria-current={isHere ? 'page' : undefined}
                className={`hover:border-field inline-flex min-h-10 items-center border-b-2 px-2.5 ${isHere ? 'border-chaff font-medium' : 'border-transparent'}`}
              >
                {label}
              </Link>
            </li>
          );
        })}
      </ul>
    </nav>
  );
}
