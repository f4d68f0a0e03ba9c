import { z } from 'zod';

export const columnFields = [
  'label',
  'radius',
  'diameter',
  'mass',
  'density',
  'material',
  'count',
  'radiusSigma',
  'diameterSigma',
  'massSigma',
  'densitySigma',
  'ignore',
] as const;

export type ColumnField = (typeof columnFields)[number];

export const columnMapping = z
  .record(
    z.string().max(200),
    z.strictObject({
      field: z.enum(columnFields).describe('What the column holds; `ignore` leaves it out'),
      unit: z
        .string()
        .min(1)
        .max(40)
        .optional()
        .describe('For sizes, masses, densities and their errors: um, g_cm3 ...'),
    }),
  )
  .describe('Header of the column -> what it holds, and in which unit');
export type ColumnMapping = z.infer<typeof columnMapping>;
