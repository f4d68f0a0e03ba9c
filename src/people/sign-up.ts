import { UniqueConstraintViolationException, type EntityManager } from '@mikro-orm/postgresql';
import { z } from 'zod';
import { Membership, Person, ResearchGroup } from '@/entities';
import { recordChange } from '@/src/audit/record-change';
import { Refusal } from '@/src/errors';
import { checkNewPassword, hashPassword } from './passwords';
import { sendVerification, type LinkMaker } from './verify-address';

export const email = z.string().trim().toLowerCase().max(254).pipe(z.email('does not look like an e-mail address'));

export const signUpInput = z.object({
  name: z.string().trim().min(1, 'is needed').max(200),
  email,
  password: z.string().max(1000),
  groupName: z.string().trim().min(1, 'is needed').max(200),
});
export type SignUpInput = z.infer<typeof signUpInput>;

/** A new person with a group of their own, of which they are the principal investigator. */
export async function signUp(
  em: EntityManager,
  input: SignUpInput,
  linkTo: LinkMaker,
): Promise<{ personId: string; groupId: string }> {
  checkNewPassword(input.password);
  const passwordHash = await hashPassword(input.password);
  try {
    return await em.transactional(async (tx) => {
      const person = tx.create(Person, { name: input.name, email: input.email, passwordHash });
      const group = tx.create(ResearchGroup, { name: input.groupName });
      tx.create(Membership, { person, group, role: 'pi' });
      await tx.flush();
      recordChange(
        tx,
        { personId: person.id, name: person.name },
        { action: 'account.signUp', target: { kind: 'group', id: group.id, name: group.name }, groupId: group.id },
      );
      await tx.flush();
      await sendVerification(tx, person, linkTo);
      return { personId: person.id, groupId: group.id };
    });
  } catch (error) {
    if (!(error instanceof UniqueConstraintViolationException)) throw error;
    const detail = 'This address cannot be used for a new account. If it is yours, sign in instead.';
    throw new Refusal('conflict', detail, [{ pointer: '/email', detail }]);
  }
}
