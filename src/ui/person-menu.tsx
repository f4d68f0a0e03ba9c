import Link from 'next/link';
import { Button } from './button';

type Props = { name: string; groupName: string | null; role: string; signOut: () => Promise<void> };

/** A disclosure that works without script: who is signed in, and the way out. */
export function PersonMenu({ name, groupName, role, signOut }: Props) {
  return (
    <details className="group relative">
      <summary className="hover:bg-line/50 flex min-h-10 list-none items-center gap-2 rounded-md px-2">
        <span
          className="bg-straw inline-flex size-7 items-center justify-center rounded-full text-sm font-medium text-[#12162a]"
          aria-hidden="true"
        >
          {initials(name)}
        </span>
        <span className="max-w-40 truncate text-sm max-sm:sr-only">{name}</span>
      </summary>
      <div className="bg-panel border-line absolute right-0 z-30 mt-1 grid w-72 gap-3 rounded-lg border p-4 shadow-lg">
        <div>
          <p className="font-medium">{name}</p>
          <p className="text-muted text-sm">
            {role}
            {groupName ? `, ${groupName}` : ''}
          </p>
        </div>
        <Link href="/account" className="prose-link text-sm">
          Account and access tokens
        </Link>
        <form action={signOut}>
          <Button type="submit" size="small">
            Sign out
          </Button>
        </form>
      </div>
    </details>
  );
}

const initials = (name: string): string =>
  name
    .split(/\s+/)
    .map((part) => part[0] ?? '')
    .slice(0, 2)
    .join('')
    .toUpperCase();
