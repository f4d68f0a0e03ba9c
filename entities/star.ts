import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { createdAt, id } from './columns';
import { ResearchGroup } from './research-group';

/** A star preset; its numbers stand in its versions. Without a group it is everybody's. */
export const Star = defineEntity({
  name: 'Star',
  tableName: 'star',
  properties: {
    id: id(),
    slug: p.string().length(64),
    group: () => p.manyToOne(ResearchGroup).nullable().deleteRule('cascade'),
    createdAt: createdAt(),
  },
  indexes: [
    {
      name: 'star_slug_of_owner',
      expression: 'create unique index star_slug_of_owner on star (slug, group_id) nulls not distinct',
    },
  ],
  checks: [{ name: 'star_slug_form', expression: "slug ~ '^[a-z0-9][a-z0-9_-]*$'" }],
});
export type Star = InferEntity<typeof Star>;
