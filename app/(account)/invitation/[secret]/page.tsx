import type { Metadata } from 'next';
import Link from 'next/link';
import { openInvitation } from '@/src/people/open-invitation';
import { LinkButton } from '@/src/ui/link-button';
import { Notice } from '@/src/ui/notice';
import { roleWords } from '@/src/ui/role-words';
import { optionalActor, orNotFound, pageEm } from '@/src/web/page';
import { AcceptForm } from './accept-form';
import { NewPersonForm } from './new-person-form';

export const metadata: Metadata = { title: 'Invitation', robots: 'noindex', referrer: 'no-referrer' };

type Props = { params: Promise<{ secret: string }> };

/** Opening the link changes nothing: mail programs do so by themselves. */
export default async function InvitationPage({ params }: Props) {
  const { secret } = await params;
  const offer = await orNotFound(openInvitation(await pageEm(), secret));
  const actor = await optionalActor();
  return (
    <div className="grid gap-6">
      <h1 className="text-3xl">{`Join ${offer.groupName}`}</h1>
      <p>{`${offer.invitedBy} invites ${offer.email} as ${roleWords[offer.role].toLowerCase()}.`}</p>
      {actor && actor.email === offer.email && <AcceptForm secret={secret} />}
      {actor && actor.email !== offer.email && (
        <Notice kind="info" title={`You are signed in as ${actor.email}`}>
          {`This invitation is for ${offer.email}: sign out and open the link again.`}
        </Notice>
      )}
      {!actor && offer.hasAccount && (
        <div>
          <LinkButton href={`/sign-in?next=${encodeURIComponent(`/invitation/${secret}`)}`} variant="primary">
            Sign in to accept
          </LinkButton>
        </div>
      )}
      {!actor && !offer.hasAccount && <NewPersonForm secret={secret} email={offer.email} />}
      <p className="text-muted text-sm">
        Not expected? Close this page: nothing happens.{' '}
        <Link href="/" className="prose-link">
          What Chaffline is
        </Link>
      </p>
    </div>
  );
}
