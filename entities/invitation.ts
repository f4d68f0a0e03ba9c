import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { createdAt, id, moment } from './columns';
import { groupRoles } from './membership';
import { Person } from './person';
import { ResearchGroup } from './research-group';

/** A way into a group for one address, once. The table keeps the hash of the link's secret. */
export const Invitation = defineEntity({
  name: 'Invitation',
  tableName: 'invitation',
  properties: {
    id: id(),
    group: () => p.manyToOne(ResearchGroup).deleteRule('cascade'),
    email: p.string().length(254),
    role: p.enum([...groupRoles]),
    secretSha256: p.string().length(64).unique().hidden(),
    invitedBy: () => p.manyToOne(Person),
    createdAt: createdAt(),
    expiresAt: moment(),
    acceptedAt: moment().nullable(),
    revokedAt: moment().nullable(),
  },
  indexes: [
    {
      name: 'invitation_open_once',
      expression:
        'create unique index invitation_open_once on invitation (group_id, email) where accepted_at is null and revoked_at is null',
    },
  ],
  checks: [{ name: 'invitation_email_lower_case', expression: 'email = lower(email)' }],
});
export type Invitation = InferEntity<typeof Invitation>;
