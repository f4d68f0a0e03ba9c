import type { Metadata } from 'next';
import { listTokens, type TokenItem } from '@/src/people/tokens';
import { DataTable, type DataColumn } from '@/src/ui/data-table';
import { PageHeader } from '@/src/ui/page-header';
import { Moment } from '@/src/ui/run-moment';
import { RunSection } from '@/src/ui/run-section';
import { pageActor, pageEm } from '@/src/web/page';
import { RevokeToken } from './revoke-token';
import { TokenForm } from './token-form';

export const metadata: Metadata = { title: 'Account' };

const columns: DataColumn<TokenItem>[] = [
  {
    header: 'Token',
    show: ({ name, lastFour }) => (
      <>
        {name} <span className="text-muted font-mono text-xs">…{lastFour}</span>
      </>
    ),
  },
  { header: 'Group', show: ({ group }) => group },
  { header: 'May', show: ({ scopes }) => (scopes.includes('write') ? 'read and change' : 'read') },
  { header: 'Valid until', show: ({ expiresAt }) => <Moment iso={expiresAt} /> },
  { header: 'Last used', show: ({ lastUsedAt }) => (lastUsedAt ? <Moment iso={lastUsedAt} /> : 'never') },
  { header: 'State', show: ({ id, name, revokedAt }) => (revokedAt ? 'revoked' : <RevokeToken id={id} name={name} />) },
];

export default async function AccountPage() {
  const actor = await pageActor();
  const tokens = await listTokens(await pageEm(), actor);
  return (
    <>
      <PageHeader title="Account" subtitle={`${actor.name}, ${actor.email}`} />
      <RunSection id="tokens" title="Access tokens">
        <p className="mb-6 max-w-prose">
          A token lets a script act as you in your group: send it as{' '}
          <span className="font-mono text-sm">Authorization: Bearer …</span> to the addresses in{' '}
          <a href="/api/v1/openapi.json" className="prose-link">
            /api/v1/openapi.json
          </a>
          .
        </p>
        <TokenForm />
        {tokens.length > 0 && (
          <div className="mt-10">
            <DataTable caption="Your access tokens" columns={columns} rows={tokens} rowKey={({ id }) => id} />
          </div>
        )}
      </RunSection>
    </>
  );
}
