import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { createdAt, real } from './columns';

/**
 * A spectrum-averaged curve, paid for once. The key is the SHA-256 of everything it depends on: optics, mixture,
 * spectrum and engine version.
 */
export const Curve = defineEntity({
  name: 'Curve',
  tableName: 'curve',
  properties: {
    key: p.string().length(64).primary(),
    engineVersion: p.string().length(20),
    encoded: p.blob(),
    relativeErrorBound: real(),
    shareOutsideValidRange: real(),
    createdAt: createdAt(),
  },
});
export type Curve = InferEntity<typeof Curve>;
