import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { createdAt, id, moment } from './columns';
import { Person } from './person';
import { Run } from './run';

/** A link under which a run can be seen without an account. The table keeps the hash of the link's secret. */
export const Share = defineEntity({
  name: 'Share',
  tableName: 'share',
  properties: {
    id: id(),
    run: () => p.manyToOne(Run).deleteRule('cascade').index(),
    createdBy: () => p.manyToOne(Person),
    secretSha256: p.string().length(64).unique().hidden(),
    passphraseHash: p.text().nullable(),
    mayDownload: p.boolean(),
    views: p.integer().default(0),
    createdAt: createdAt(),
    expiresAt: moment(),
    revokedAt: moment().nullable(),
  },
});
export type Share = InferEntity<typeof Share>;
