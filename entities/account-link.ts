import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { createdAt, id, moment } from './columns';
import { Person } from './person';

export const linkPurposes = ['verify', 'reset'] as const;

/** A link that proves who reads an address: once, for one purpose, for a while. The table keeps the hash of its secret. */
export const AccountLink = defineEntity({
  name: 'AccountLink',
  tableName: 'account_link',
  properties: {
    id: id(),
    person: () => p.manyToOne(Person).deleteRule('cascade').index(),
    purpose: p.enum([...linkPurposes]),
    email: p.string().length(254),
    secretSha256: p.string().length(64).unique().hidden(),
    createdAt: createdAt(),
    expiresAt: moment(),
    usedAt: moment().nullable(),
  },
});
export type AccountLink = InferEntity<typeof AccountLink>;
