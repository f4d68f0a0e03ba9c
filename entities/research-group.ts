import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { createdAt, id } from './columns';

export const ResearchGroup = defineEntity({
  name: 'ResearchGroup',
  tableName: 'research_group',
  properties: {
    id: id(),
    name: p.string().length(200),
    createdAt: createdAt(),
  },
});
export type ResearchGroup = InferEntity<typeof ResearchGroup>;
