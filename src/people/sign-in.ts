import type { EntityManager } from '@mikro-orm/postgresql';
import { z } from 'zod';
import { Membership, Person } from '@/entities';
import { recordChange } from '@/src/audit/record-change';
import { Refusal } from '@/src/errors';
import { passwordMatches } from './passwords';
import { email } from './sign-up';

export const signInInput = z.object({ email, password: z.string().min(1, 'is needed').max(1000) });

/** The person and the group they start in: the one they joined first. */
export async function signIn(em: EntityManager, input: z.infer<typeof signInInput>) {
  const person = await em.findOne(Person, { email: input.email, disabledAt: null });
  if (!(await passwordMatches(input.password, person?.passwordHash)) || !person) {
    throw new Refusal('unauthenticated', 'This e-mail address and password do not belong together.');
  }
  const membership = await em.findOne(Membership, { person: person.id }, { orderBy: { createdAt: 'asc', id: 'asc' } });
  const groupId = membership?.group.id ?? null;
  recordChange(
    em,
    { personId: person.id, name: person.name },
    { action: 'account.signIn', target: { kind: 'person', id: person.id, name: person.name }, groupId },
  );
  await em.flush();
  return { personId: person.id, groupId };
}
