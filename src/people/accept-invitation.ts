import type { EntityManager } from '@mikro-orm/postgresql';
import { z } from 'zod';
import { Invitation, Membership, Person } from '@/entities';
import { recordChange, type Doer } from '@/src/audit/record-change';
import { notFound, Refusal } from '@/src/errors';
import { lockGroup } from './lock-group';
import { openInvitation } from './open-invitation';
import { checkNewPassword, hashPassword } from './passwords';

export const invitedPersonInput = z.object({
  name: z.string().trim().min(1, 'is needed').max(200),
  password: z.string().max(1000),
});

type Joined = { personId: string; groupId: string };

/** The invited person, signed in with the invited address, joins. */
export async function acceptInvitation(
  em: EntityManager,
  person: { personId: string; name: string; email: string },
  secret: string,
): Promise<Joined> {
  return em.transactional(async (tx) => {
    const offer = await openInvitation(tx, secret);
    if (offer.email !== person.email) {
      throw new Refusal('forbidden', `This invitation is for ${offer.email}. Sign in with that address.`);
    }
    return join(tx, offer, person);
  });
}

/** Somebody without an account makes one for the invited address and joins. */
export async function acceptAsNewPerson(
  em: EntityManager,
  input: z.infer<typeof invitedPersonInput>,
  secret: string,
): Promise<Joined> {
  checkNewPassword(input.password);
  const passwordHash = await hashPassword(input.password);
  return em.transactional(async (tx) => {
    const offer = await openInvitation(tx, secret);
    if (offer.hasAccount) throw new Refusal('conflict', 'There is an account with this address. Sign in to accept.');
    const person = tx.create(Person, {
      name: input.name,
      email: offer.email,
      passwordHash,
      emailVerifiedAt: new Date(),
    });
    await tx.flush();
    return join(tx, offer, { personId: person.id, name: person.name });
  });
}

/** Of two who accept at once one finds the invitation open. */
async function join(
  tx: EntityManager,
  offer: { id: string; groupId: string; role: Membership['role'] },
  doer: Doer & { personId: string },
): Promise<Joined> {
  await lockGroup(tx, offer.groupId);
  const taken = await tx.nativeUpdate(
    Invitation,
    { id: offer.id, acceptedAt: null, revokedAt: null, expiresAt: { $gt: new Date() } },
    { acceptedAt: new Date() },
  );
  if (taken === 0) throw notFound('invitation');
  const there = await tx.findOne(Membership, { person: doer.personId, group: offer.groupId });
  if (!there) tx.create(Membership, { person: doer.personId, group: offer.groupId, role: offer.role });
  recordChange(tx, doer, {
    action: 'group.join',
    target: { kind: 'person', id: doer.personId, name: doer.name },
    groupId: offer.groupId,
    after: { role: there?.role ?? offer.role },
  });
  await tx.flush();
  return { personId: doer.personId, groupId: offer.groupId };
}
