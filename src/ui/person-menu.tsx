import Link from 'next/link';
import { Button } from './button';
import { Disclosure } from './disclosure';

type Props = {
  name: string;
  groupName: string | null;
  role: string;
  links: readonly { href: string; label: string }[];
  signOut: () => Promise<void>;
};

/** Who is signed in, for which group, and the way out. */
export function PersonMenu({ name, groupName, role, links, signOut }: Props) {
  return (
    <Disclosure
      summaryClass="hover:bg-line/50 flex min-h-11 items-center gap-2 rounded-md px-2"
      summary={
        <>
          <span
            className="bg-straw inline-flex size-7 items-center justify-center rounded-full text-sm font-medium text-[#12162a]"
            aria-hidden="true"
          >
            {initials(name)}
          </span>
          <span className="max-w-40 truncate text-sm max-sm:sr-only">{name}</span>
        </>
      }
    >
      <div className="bg-panel border-line absolute right-0 z-30 mt-1 grid w-72 max-w-[calc(100vw-2rem)] gap-3 rounded-lg border p-4 shadow-lg">
        <div>
          <p className="font-medium">{name}</p>
          <p className="text-muted text-sm">
            {role}
            {groupName ? `, ${groupName}` : ''}
          </p>
        </div>
        <ul className="grid gap-1.5">
          {links.map(({ href, label }) => (
            <li key={href}>
              <Link href={href} className="prose-link text-sm">
                {label}
              </Link>
            </li>
          ))}
        </ul>
        <form action={signOut}>
          <Button type="submit" size="small">
            Sign out
          </Button>
        </form>
      </div>
    </Disclosure>
  );
}

const initials = (name: string): string =>
  name
    .split(/\s+/)
    .map((part) => part[0] ?? '')
    .slice(0, 2)
    .join('')
    .toUpperCase();
