import type { EntityManager } from '@mikro-orm/postgresql';
import { z } from 'zod';
import { Person } from '@/entities';
import { recordChange } from '@/src/audit/record-change';
import { queueMail } from '@/src/mail/queue-mail';
import { newAccountLink, useAccountLink } from './account-links';
import { checkNewPassword, hashPassword } from './passwords';
import { secretDigest } from './secrets';
import { endAllSessions } from './sessions';
import { email } from './sign-up';
import type { LinkMaker } from './verify-address';

export const forgottenInput = z.object({ email });

/** Says nothing about whether there is such a person: the answer is the same, and the mail alone tells. */
export async function askForReset(
  em: EntityManager,
  input: z.infer<typeof forgottenInput>,
  linkTo: LinkMaker,
): Promise<void> {
  await em.transactional(async (tx) => {
    const person = await tx.findOne(Person, { email: input.email, disabledAt: null });
    if (!person) return;
    const secret = await newAccountLink(tx, person, 'reset');
    const data = { name: person.name, link: linkTo(`/reset/${secret}`) };
    await queueMail(tx, { kind: 'reset', to: person.email, data, dedupeKey: `reset:${secretDigest(secret)}` });
  });
}

export const newPasswordInput = z.object({ password: z.string().max(1000) });

/** A new password by link: every session ends, nobody is signed in by it, and the address is told. */
export async function resetPassword(
  em: EntityManager,
  secret: string,
  { password }: z.infer<typeof newPasswordInput>,
): Promise<void> {
  checkNewPassword(password);
  const passwordHash = await hashPassword(password);
  await em.transactional(async (tx) => {
    const person = await useAccountLink(tx, secret, 'reset');
    person.passwordHash = passwordHash;
    person.emailVerifiedAt ??= new Date();
    await passwordWasChanged(tx, person, 'account.resetPassword', secretDigest(secret));
    await endAllSessions(tx, person.id);
  });
}

export async function passwordWasChanged(
  tx: EntityManager,
  person: Person,
  action: string,
  once: string,
): Promise<void> {
  recordChange(
    tx,
    { personId: person.id, name: person.name },
    { action, target: { kind: 'person', id: person.id, name: person.name }, groupId: null },
  );
  await tx.flush();
  await queueMail(tx, {
    kind: 'passwordChanged',
    to: person.email,
    data: { name: person.name },
    dedupeKey: `passwordChanged:${once}`,
  });
}
