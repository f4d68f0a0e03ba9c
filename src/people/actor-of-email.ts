import type { EntityManager } from '@mikro-orm/postgresql';
import { Membership, Person } from '@/entities';
import { tokenScopes } from '@/entities/personal-token';
import type { Actor } from '@/src/access/actor';
import { notFound } from '@/src/errors';
import { actorFor } from './actors';

/** For commands that an operator types: the person acts in the group they joined first. */
export async function actorOfEmail(em: EntityManager, email: string): Promise<Actor> {
  const person = await em.findOne(Person, { email: email.trim().toLowerCase(), disabledAt: null });
  if (!person) throw notFound(`person: ${email}`);
  const membership = await em.findOne(Membership, { person: person.id }, { orderBy: { createdAt: 'asc', id: 'asc' } });
  return actorFor(em, person, membership?.group.id ?? null, tokenScopes);
}
