import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { real } from './columns';
import { Run } from './run';

/** What a run says of one grain: written by COPY, read in pages. Null where a quantity does not exist. */
export const RunGrain = defineEntity({
  name: 'RunGrain',
  tableName: 'run_grain',
  properties: {
    run: () => p.manyToOne(Run).primary().deleteRule('cascade'),
    ordinal: p.integer().primary(),
    qpr: real(),
    beta: real(),
    pUnbound: real(),
    isUnbound: p.boolean(),
    regime: p.smallint(),
    prTimeYr: real().nullable(),
    collisionTimeYr: real().nullable(),
    semiMajorAxisAu: real().nullable(),
    eccentricity: real().nullable(),
    vInfKmS: real().nullable(),
    temperatureK: real().nullable(),
    lorentzRatio: real().nullable(),
  },
  indexes: [{ name: 'run_grain_by_beta', properties: ['run', 'beta', 'ordinal'] }],
  checks: [
    { name: 'run_grain_probability', expression: 'p_unbound between 0 and 1' },
    { name: 'run_grain_regime', expression: 'regime between 0 and 2' },
  ],
});
export type RunGrain = InferEntity<typeof RunGrain>;
