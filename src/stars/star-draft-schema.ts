import { z } from 'zod';
import { starNumbers } from './schema';

/** A star as it is drafted; ranges as for numbers of one's own. */
export const starDraft = starNumbers.extend({
  name: z.string().trim().min(1, 'is needed').max(200),
  spectralType: z.string().trim().max(40).optional(),
  radiusSun: z.number('must be a number').positive().max(2000).optional().describe('Radius in nominal solar radii'),
  citation: z.string().trim().min(1, 'is needed: where are these numbers from?').max(2000),
  note: z.string().trim().max(4000).default(''),
});
export type StarDraft = z.output<typeof starDraft>;

export const newStar = starDraft.extend({
  slug: z
    .string()
    .trim()
    .toLowerCase()
    .regex(/^[a-z0-9][a-z0-9_-]{0,63}$/, 'may have letters, digits, _ and -, and begins with a letter or digit'),
  owner: z.enum(['group', 'everybody']),
});
export type NewStar = z.output<typeof newStar>;
