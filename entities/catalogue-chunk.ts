import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { Catalogue } from './catalogue';

/** The very bytes that were uploaded, in pieces, so that they can be streamed in and out. */
export const CatalogueChunk = defineEntity({
  name: 'CatalogueChunk',
  tableName: 'catalogue_chunk',
  properties: {
    catalogue: () => p.manyToOne(Catalogue).primary().deleteRule('cascade'),
    ordinal: p.integer().primary(),
    bytes: p.blob(),
  },
});
export type CatalogueChunk = InferEntity<typeof CatalogueChunk>;
