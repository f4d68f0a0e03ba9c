import type { Metadata } from 'next';
import { listSessions } from '@/src/people/own-sessions';
import { listTokens, type TokenItem } from '@/src/people/tokens';
import { isVerified } from '@/src/people/verify-address';
import { ActionButton } from '@/src/ui/action-button';
import { DataTable, type DataColumn } from '@/src/ui/data-table';
import { Notice } from '@/src/ui/notice';
import { PageHeader } from '@/src/ui/page-header';
import { Moment } from '@/src/ui/run-moment';
import { RunSection } from '@/src/ui/run-section';
import { pageActor, pageEm, sessionSecret } from '@/src/web/page';
import { sendVerificationAction } from './actions';
import { PasswordForm } from './password-form';
import { RevokeToken } from './revoke-token';
import { SessionTable } from './session-table';
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
  const em = await pageEm();
  const tokens = await listTokens(em, actor);
  const sessions = await listSessions(em, actor, await sessionSecret());
  const verified = await isVerified(em, actor);
  return (
    <>
      <PageHeader title="Account" subtitle={`${actor.name}, ${actor.email}`} />
      <div className="grid gap-12">
        {!verified && (
          <Notice kind="caution" title="Your e-mail address is not confirmed">
            <p className="mb-2">Open the link in the message that was sent to {actor.email}.</p>
            <ActionButton action={sendVerificationAction}>Send it again</ActionButton>
          </Notice>
        )}
        <RunSection id="password" title="Password">
          <PasswordForm />
        </RunSection>
        <RunSection id="sessions" title="Sessions">
          <SessionTable sessions={sessions} />
        </RunSection>
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
      </div>
    </>
  );
}
