import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { createdAt, id } from './columns';
import { Person } from './person';
import { ResearchGroup } from './research-group';

export const groupRoles = ['pi', 'researcher', 'student'] as const;
export type GroupRole = (typeof groupRoles)[number];

export const Membership = defineEntity({
  name: 'Membership',
  tableName: 'membership',
  properties: {
    id: id(),
    person: () => p.manyToOne(Person).deleteRule('cascade'),
    group: () => p.manyToOne(ResearchGroup).deleteRule('cascade'),
    role: p.enum([...groupRoles]),
    createdAt: createdAt(),
  },
  uniques: [{ name: 'membership_person_group', properties: ['person', 'group'] }],
});
export type Membership = InferEntity<typeof Membership>;
