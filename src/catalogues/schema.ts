import { z } from 'zod';
import { catalogueStatuses, invalidRowRules } from '@/entities/catalogue';

export const catalogueDefaults = z.strictObject({
  densityGCm3: z.number().positive().max(25).optional().describe('Density of rows without one, g/cm3'),
  material: z.string().min(1).max(64).optional().describe('Slug or alias of the material of rows without one'),
});

export const invalidRowRule = z
  .enum(invalidRowRules)
  .describe(
    'What bad rows do: `refuse` fails the catalogue and keeps the list of rejects, `leaveOut` goes on without them',
  );

export const catalogueItem = z.object({
  id: z.uuid(),
  name: z.string(),
  fileName: z.string(),
  status: z.enum(catalogueStatuses),
  failure: z.string().nullable().describe('Why the catalogue failed, as a sentence'),
  warnings: z.array(z.string()),
  rows: z.object({
    accepted: z.number().int(),
    rejected: z.number().int(),
    blank: z.number().int(),
    checked: z.number().int().describe('Rows read so far, while the status is checking'),
  }),
  materials: z.array(z.object({ material: z.string(), grains: z.number() })),
  onInvalidRows: invalidRowRule,
  sha256: z.string(),
  byteSize: z.number().int(),
  uploadedBy: z.string(),
  createdAt: z.iso.datetime(),
  checkedAt: z.iso.datetime().nullable(),
});
export type CatalogueItem = z.infer<typeof catalogueItem>;

export const catalogueGrainItem = z.object({
  ordinal: z.number().int(),
  line: z.number().int().describe('Line of the uploaded file'),
  label: z.string().nullable(),
  radiusUm: z.number(),
  radiusSigmaUm: z.number().nullable(),
  densityGCm3: z.number(),
  densitySigmaGCm3: z.number().nullable(),
  material: z.string(),
  count: z.number(),
});
export type CatalogueGrainItem = z.infer<typeof catalogueGrainItem>;

export const rejectItem = z.object({
  ordinal: z.number().int(),
  line: z.number().int(),
  column: z.string().nullable(),
  value: z.string().nullable(),
  reason: z.string(),
  raw: z.string(),
});
export type RejectItem = z.infer<typeof rejectItem>;
