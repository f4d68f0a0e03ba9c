import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { createdAt, id, moment, real } from './columns';
import { Person } from './person';
import { Star } from './star';

export const presetStatuses = ['draft', 'published', 'retired'] as const;
export type PresetStatus = (typeof presetStatuses)[number];

export type StarSpectrum = { wavelengthUm: number[]; flux: number[] };

/** Immutable once published: a trigger refuses every change but the step to retired. */
export const StarVersion = defineEntity({
  name: 'StarVersion',
  tableName: 'star_version',
  properties: {
    id: id(),
    star: () => p.manyToOne(Star).deleteRule('cascade'),
    version: p.integer(),
    status: p.enum([...presetStatuses]),
    name: p.string().length(200),
    spectralType: p.string().length(40).nullable(),
    massSun: real(),
    luminositySun: real(),
    teffK: real(),
    radiusSun: real().nullable(),
    spectrum: p.json().$type<StarSpectrum | null>().nullable(),
    citation: p.text(),
    note: p.text().default(''),
    createdBy: () => p.manyToOne(Person).nullable().deleteRule('set null'),
    createdAt: createdAt(),
    publishedAt: moment().nullable(),
  },
  uniques: [{ name: 'star_version_number', properties: ['star', 'version'] }],
  checks: [
    { name: 'star_version_mass', expression: 'mass_sun between 0.05 and 100' },
    { name: 'star_version_luminosity', expression: 'luminosity_sun between 1e-5 and 1e6' },
    { name: 'star_version_teff', expression: 'teff_k between 2000 and 60000' },
  ],
});
export type StarVersion = InferEntity<typeof StarVersion>;
