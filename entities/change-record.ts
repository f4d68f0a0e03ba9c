import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { createdAt, id } from './columns';

/**
 * Who did what to what. Names stand beside ids, because the record outlives what it speaks of; a trigger refuses every change
 * and removal of a row.
 */
export const ChangeRecord = defineEntity({
  name: 'ChangeRecord',
  tableName: 'change_record',
  properties: {
    id: id(),
    groupId: p.uuid().nullable(),
    personId: p.uuid().nullable(),
    personName: p.string().length(200),
    action: p.string().length(60),
    targetKind: p.string().length(40),
    targetId: p.string().length(64),
    targetName: p.string().length(300).default(''),
    before: p.json().$type<object | null>().nullable(),
    after: p.json().$type<object | null>().nullable(),
    createdAt: createdAt(),
  },
  indexes: [
    { name: 'change_record_of_group', properties: ['groupId', 'createdAt', 'id'] },
    { name: 'change_record_by_time', properties: ['createdAt', 'id'] },
  ],
});
export type ChangeRecord = InferEntity<typeof ChangeRecord>;
