import { z } from 'zod';

/** Query parameters arrive as text; what is no number is refused, also the empty text. */
const numeric = z
  .string()
  .regex(/^[-+]?(\d+\.?\d*|\.\d+)([eE][-+]?\d+)?$/, 'must be a number')
  .transform(Number)
  .pipe(z.number());

const whole = (max: number) =>
  z
    .string()
    .regex(/^\d{1,9}$/, 'must be a whole number')
    .transform(Number)
    .pipe(z.number().max(max));

/** What every table that is sorted and filtered by the server understands. */
export const gridPaging = {
  order: z.enum(['asc', 'desc']).default('asc'),
  limit: whole(1000).pipe(z.number().min(1)).default(50).describe('How many items (1 to 1000)'),
  after: z.string().max(600).optional().describe('The `next` of the page before'),
  offset: whole(1_000_000_000)
    .optional()
    .describe('Rows to pass over; for grids that jump. Ignored together with `after`'),
};

export const grainFilters = {
  material: z.string().max(64).optional().describe('Slug of the material'),
  label: z.string().max(200).optional().describe('Part of the label, in any case'),
  radiusUmMin: numeric.optional(),
  radiusUmMax: numeric.optional(),
};

export const numericQuery = numeric;
