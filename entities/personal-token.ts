import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { createdAt, id, moment } from './columns';
import { Person } from './person';
import { ResearchGroup } from './research-group';

export const tokenScopes = ['read', 'write'] as const;
export type TokenScope = (typeof tokenScopes)[number];

export const PersonalToken = defineEntity({
  name: 'PersonalToken',
  tableName: 'personal_token',
  properties: {
    id: id(),
    person: () => p.manyToOne(Person).deleteRule('cascade').index(),
    group: () => p.manyToOne(ResearchGroup).deleteRule('cascade'),
    name: p.string().length(100),
    secretSha256: p.string().length(64).unique().hidden(),
    lastFour: p.string().length(4),
    scopes: p.array().$type<TokenScope[]>(),
    createdAt: createdAt(),
    expiresAt: moment(),
    lastUsedAt: moment().nullable(),
    revokedAt: moment().nullable(),
  },
});
export type PersonalToken = InferEntity<typeof PersonalToken>;
