import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { createdAt, moment } from './columns';
import { Person } from './person';
import { ResearchGroup } from './research-group';

/** The primary key is the SHA-256 of the secret in the cookie: who reads this table can sign in as nobody. */
export const Session = defineEntity({
  name: 'Session',
  tableName: 'session',
  properties: {
    id: p.string().length(64).primary(),
    person: () => p.manyToOne(Person).deleteRule('cascade').index(),
    group: () => p.manyToOne(ResearchGroup).nullable().deleteRule('set null'),
    userAgent: p.string().length(300).default(''),
    createdAt: createdAt(),
    expiresAt: moment(),
    endsAt: moment(),
  },
});
export type Session = InferEntity<typeof Session>;
