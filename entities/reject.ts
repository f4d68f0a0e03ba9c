import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { Catalogue } from './catalogue';

/** One reason why one row of a catalogue was not accepted. */
export const Reject = defineEntity({
  name: 'Reject',
  tableName: 'reject',
  properties: {
    catalogue: () => p.manyToOne(Catalogue).primary().deleteRule('cascade'),
    ordinal: p.integer().primary(),
    line: p.integer(),
    column: p.text().fieldName('column_name').nullable(),
    value: p.text().nullable(),
    reason: p.text(),
    raw: p.text(),
  },
});
export type Reject = InferEntity<typeof Reject>;
