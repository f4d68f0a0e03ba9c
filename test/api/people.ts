import { Membership, Person, ResearchGroup } from '@/entities';
import type { GroupRole } from '@/entities/membership';
import type { TokenScope } from '@/entities/personal-token';
import type { Actor } from '@/src/access/actor';
import { forkEm } from '@/src/db';
import { actorOfEmail } from '@/src/people/actor-of-email';
import { hashPassword } from '@/src/people/passwords';
import { makeToken } from '@/src/people/tokens';

export type Member = { actor: Actor; token: string };

let made = 0;

/** One for all: hashing takes time. */
const hash = hashPassword('the password of the test');

export async function newGroup(name = `Group ${++made}`): Promise<string> {
  const em = await forkEm();
  const group = em.create(ResearchGroup, { name });
  await em.flush();
  return group.id;
}

/** A person of a group with a token. */
export async function newMember(
  groupId: string,
  role: GroupRole,
  scopes: TokenScope[] = ['read', 'write'],
): Promise<Member> {
  const em = await forkEm();
  const email = `person${++made}@example.org`;
  const person = em.create(Person, { name: `Person ${made}`, email, passwordHash: await hash });
  em.create(Membership, { person, group: groupId, role });
  await em.flush();
  const actor = await actorOfEmail(em, email);
  const { token } = await makeToken(em, actor, { name: 'test', scopes, expiresInDays: 1 });
  return { actor, token };
}
