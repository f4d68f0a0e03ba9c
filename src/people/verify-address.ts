import type { EntityManager } from '@mikro-orm/postgresql';
import { Person } from '@/entities';
import type { Actor } from '@/src/access/actor';
import { recordChange } from '@/src/audit/record-change';
import { queueMail } from '@/src/mail/queue-mail';
import { newAccountLink, useAccountLink } from './account-links';
import { secretDigest } from './secrets';

export type LinkMaker = (path: string) => string;

/** Sends the link that confirms the address, in the caller's transaction. */
export async function sendVerification(tx: EntityManager, person: Person, linkTo: LinkMaker): Promise<void> {
  const secret = await newAccountLink(tx, person, 'verify');
  const data = { name: person.name, link: linkTo(`/verify/${secret}`) };
  await queueMail(tx, { kind: 'verify', to: person.email, data, dedupeKey: `verify:${secretDigest(secret)}` });
}

export async function sendVerificationAgain(em: EntityManager, actor: Actor, linkTo: LinkMaker): Promise<void> {
  await em.transactional(async (tx) => {
    const person = await tx.findOneOrFail(Person, { id: actor.personId });
    if (!person.emailVerifiedAt) await sendVerification(tx, person, linkTo);
  });
}

export async function verifyAddress(em: EntityManager, secret: string): Promise<void> {
  await em.transactional(async (tx) => {
    const person = await useAccountLink(tx, secret, 'verify');
    person.emailVerifiedAt ??= new Date();
    recordChange(
      tx,
      { personId: person.id, name: person.name },
      { action: 'account.verify', target: { kind: 'person', id: person.id, name: person.name }, groupId: null },
    );
  });
}

export async function isVerified(em: EntityManager, actor: Actor): Promise<boolean> {
  return (await em.count(Person, { id: actor.personId, emailVerifiedAt: { $ne: null } })) > 0;
}
