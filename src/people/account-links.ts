import type { EntityManager } from '@mikro-orm/postgresql';
import { AccountLink, type Person } from '@/entities';
import { notFound } from '@/src/errors';
import { newSecret, secretDigest } from './secrets';

type Purpose = AccountLink['purpose'];

const validForMs: Record<Purpose, number> = { verify: 24 * 3_600_000, reset: 3_600_000 };

/** A fresh link; older ones of the same purpose stop working. */
export async function newAccountLink(tx: EntityManager, person: Person, purpose: Purpose): Promise<string> {
  await tx.nativeUpdate(AccountLink, { person: person.id, purpose, usedAt: null }, { usedAt: new Date() });
  const secret = newSecret();
  tx.create(AccountLink, {
    person,
    purpose,
    email: person.email,
    secretSha256: secretDigest(secret),
    expiresAt: new Date(Date.now() + validForMs[purpose]),
  });
  await tx.flush();
  return secret;
}

const open = (secret: string, purpose: Purpose) => ({
  secretSha256: secretDigest(secret),
  purpose,
  usedAt: null,
  expiresAt: { $gt: new Date() },
});

/** Whether a link would work; looking uses nothing up. */
export async function isOpenLink(em: EntityManager, secret: string, purpose: Purpose): Promise<boolean> {
  return (await em.count(AccountLink, open(secret, purpose))) > 0;
}

/** Uses the link up; of two at once one finds it open. The address must still be the person's. */
export async function useAccountLink(tx: EntityManager, secret: string, purpose: Purpose): Promise<Person> {
  const link = await tx.findOne(AccountLink, open(secret, purpose), { populate: ['person'] });
  const taken = link ? await tx.nativeUpdate(AccountLink, { id: link.id, usedAt: null }, { usedAt: new Date() }) : 0;
  if (!link || taken === 0 || link.person.email !== link.email || link.person.disabledAt) throw notFound('link');
  return link.person;
}
