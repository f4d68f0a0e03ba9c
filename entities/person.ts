import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { createdAt, id, moment } from './columns';

export const Person = defineEntity({
  name: 'Person',
  tableName: 'person',
  properties: {
    id: id(),
    email: p.string().length(254).unique(),
    name: p.string().length(200),
    passwordHash: p.text().hidden(),
    platformRole: p.enum(['member', 'admin']).default('member'),
    createdAt: createdAt(),
    emailVerifiedAt: moment().nullable(),
    disabledAt: moment().nullable(),
  },
  checks: [{ name: 'person_email_lower_case', expression: 'email = lower(email)' }],
});
export type Person = InferEntity<typeof Person>;
