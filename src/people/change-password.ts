import { randomUUID } from 'node:crypto';
import type { EntityManager } from '@mikro-orm/postgresql';
import { z } from 'zod';
import { Person } from '@/entities';
import type { Actor } from '@/src/access/actor';
import { Refusal } from '@/src/errors';
import { checkNewPassword, hashPassword, passwordMatches } from './passwords';
import { passwordWasChanged } from './reset-password';
import { endAllSessions } from './sessions';

export const changePasswordInput = z.object({ oldPassword: z.string().max(1000), password: z.string().max(1000) });

/** Needs the old password; every session ends, the caller begins a new one. */
export async function changePassword(
  em: EntityManager,
  actor: Actor,
  { oldPassword, password }: z.infer<typeof changePasswordInput>,
): Promise<void> {
  const found = await em.findOneOrFail(Person, { id: actor.personId });
  if (!(await passwordMatches(oldPassword, found.passwordHash))) {
    const detail = 'This is not your password.';
    throw new Refusal('invalid', detail, [{ pointer: '/oldPassword', detail }]);
  }
  checkNewPassword(password);
  const passwordHash = await hashPassword(password);
  await em.transactional(async (tx) => {
    const person = await tx.findOneOrFail(Person, { id: actor.personId });
    person.passwordHash = passwordHash;
    await passwordWasChanged(tx, person, 'account.changePassword', randomUUID());
    await endAllSessions(tx, person.id);
  });
}
