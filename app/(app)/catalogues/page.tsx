import type { Metadata } from 'next';
import Link from 'next/link';
import { may } from '@/src/access/policy';
import { listCatalogues } from '@/src/catalogues/find-catalogues';
import { CatalogueTable } from '@/src/ui/catalogue-table';
import { EmptyState } from '@/src/ui/empty-state';
import { LinkButton } from '@/src/ui/link-button';
import { NoGroup } from '@/src/ui/no-group';
import { PageHeader } from '@/src/ui/page-header';
import { pageActor, pageEm } from '@/src/web/page';
import { onlyOne, orNowhere } from '../nowhere';

export const metadata: Metadata = { title: 'Catalogues' };

export default async function CataloguesPage({
  searchParams,
}: {
  searchParams: Promise<{ after?: string | string[] }>;
}) {
  const actor = await pageActor();
  if (!may(actor, 'catalogue.read')) return <NoGroup title="Catalogues" />;
  const after = onlyOne((await searchParams).after);
  const page = await orNowhere(listCatalogues(await pageEm(), actor, { limit: 50, after }));
  const upload = may(actor, 'catalogue.upload') && (
    <LinkButton href="/catalogues/new" variant="primary">
      New catalogue
    </LinkButton>
  );
  return (
    <>
      <PageHeader
        title="Catalogues"
        subtitle="Grains as they were measured or made, kept byte for byte."
        actions={upload}
      />
      {page.items.length === 0 && !after ? (
        <EmptyState title="No catalogues yet" action={upload}>
          A catalogue is a CSV file with one row per grain. Upload one, choose a star, and see what its light removes.
        </EmptyState>
      ) : (
        <CatalogueTable items={page.items} />
      )}
      {page.next && (
        <p className="mt-4">
          <Link href={`/catalogues?after=${encodeURIComponent(page.next)}`} className="prose-link">
            Older catalogues
          </Link>
        </p>
      )}
    </>
  );
}
