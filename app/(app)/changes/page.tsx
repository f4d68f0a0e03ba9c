import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { may } from '@/src/access/policy';
import { findChanges } from '@/src/audit/find-changes';
import { changeSearch, type ChangeSearch } from '@/src/audit/schema';
import { LinkButton } from '@/src/ui/link-button';
import { PageHeader } from '@/src/ui/page-header';
import { pageActor, pageEm } from '@/src/web/page';
import { ChangeSearchForm } from './change-search-form';
import { ChangeTable } from './change-table';

export const metadata: Metadata = { title: 'Changes' };

type Props = { searchParams: Promise<Record<string, string | string[] | undefined>> };

export default async function ChangesPage({ searchParams }: Props) {
  const actor = await pageActor();
  if (!may(actor, 'changes.read')) notFound();
  const given = await searchParams;
  const asked = Object.fromEntries(
    Object.entries(given).filter(([, value]) => typeof value === 'string' && value !== ''),
  );
  const parsed = changeSearch.safeParse(asked);
  const search: ChangeSearch = parsed.success ? parsed.data : {};
  const after = typeof given.after === 'string' ? given.after : undefined;
  const page = await findChanges(await pageEm(), actor, search, after);
  const query = new URLSearchParams(search as Record<string, string>);
  return (
    <>
      <PageHeader
        title="Changes"
        subtitle={
          actor.platformRole === 'admin'
            ? 'Who did what to what, in all groups.'
            : 'Who did what to what in this group.'
        }
        actions={
          <LinkButton href={`/api/v1/changes.csv?${query}`} download size="small">
            Download (CSV)
          </LinkButton>
        }
      />
      <ChangeSearchForm search={search} isInvalid={!parsed.success} />
      <ChangeTable items={page.items} />
      {page.next && (
        <p className="mt-4">
          <Link
            href={`/changes?${new URLSearchParams({ ...Object.fromEntries(query), after: page.next })}`}
            className="prose-link"
          >
            Earlier changes
          </Link>
        </p>
      )}
    </>
  );
}
