import { z } from 'zod';

export const pageQuery = z.object({
  limit: z
    .string()
    .regex(/^\d{1,3}$/, 'must be a whole number')
    .transform(Number)
    .pipe(z.number().min(1).max(200))
    .optional()
    .describe('How many items (1 to 200, 50 when left out)'),
  after: z.string().max(600).optional().describe('The `next` of the page before'),
});

export const pageOf = <T extends z.ZodType>(item: T) =>
  z.object({
    items: z.array(item),
    next: z.string().nullable().describe('Give as `after` for the next page; null at the end'),
  });
