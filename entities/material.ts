import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { createdAt, id } from './columns';
import { ResearchGroup } from './research-group';

/** A solid; its optical constants stand in its versions. Without a group it is everybody's. */
export const Material = defineEntity({
  name: 'Material',
  tableName: 'material',
  properties: {
    id: id(),
    slug: p.string().length(64),
    aliases: p.array().$type<string[]>(),
    group: () => p.manyToOne(ResearchGroup).nullable().deleteRule('cascade'),
    createdAt: createdAt(),
  },
  indexes: [
    {
      name: 'material_slug_of_owner',
      expression: 'create unique index material_slug_of_owner on material (slug, group_id) nulls not distinct',
    },
  ],
  checks: [{ name: 'material_slug_form', expression: "slug ~ '^[a-z0-9][a-z0-9_-]*$'" }],
});
export type Material = InferEntity<typeof Material>;
