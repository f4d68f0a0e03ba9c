import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { createdAt, id, moment, real } from './columns';
import { Person } from './person';
import { ResearchGroup } from './research-group';

export const catalogueStatuses = ['checking', 'ready', 'failed'] as const;
export type CatalogueStatus = (typeof catalogueStatuses)[number];

export const invalidRowRules = ['refuse', 'leaveOut'] as const;
export type InvalidRowRule = (typeof invalidRowRules)[number];

export type CatalogueMapping = Record<string, { field: string; unit?: string }>;
export type CatalogueDefaults = { densityGCm3?: number; material?: string };
export type CatalogueMaterial = { material: string; grains: number };

export const Catalogue = defineEntity({
  name: 'Catalogue',
  tableName: 'catalogue',
  properties: {
    id: id(),
    group: () => p.manyToOne(ResearchGroup),
    uploadedBy: () => p.manyToOne(Person),
    name: p.string().length(200),
    fileName: p.string().length(255),
    byteSize: real(),
    sha256: p.string().length(64),
    mapping: p.json().$type<CatalogueMapping | null>().nullable(),
    defaults: p.json().$type<CatalogueDefaults>(),
    onInvalidRows: p.enum([...invalidRowRules]),
    status: p.enum([...catalogueStatuses]),
    failure: p.text().nullable(),
    warnings: p.json().$type<string[]>(),
    materials: p.json().$type<CatalogueMaterial[]>(),
    rowsAccepted: p.integer().default(0),
    rowsRejected: p.integer().default(0),
    rowsBlank: p.integer().default(0),
    rowsChecked: p.integer().default(0),
    claim: p.uuid().nullable(),
    heartbeatAt: moment().nullable(),
    createdAt: createdAt(),
    checkedAt: moment().nullable(),
  },
  indexes: [{ name: 'catalogue_of_group', properties: ['group', 'createdAt', 'id'] }],
  checks: [
    {
      name: 'catalogue_rows_not_negative',
      expression: 'rows_accepted >= 0 and rows_rejected >= 0 and rows_blank >= 0',
    },
    { name: 'catalogue_sha256_form', expression: "sha256 ~ '^[0-9a-f]{64}$'" },
    { name: 'catalogue_failed_says_why', expression: "(status = 'failed') = (failure is not null)" },
  ],
});
export type Catalogue = InferEntity<typeof Catalogue>;
