import { z } from 'zod';
import { unboundInterval } from './schema';

export const impactItem = z.object({
  run: z.string(),
  group: z.string(),
  usedVersion: z.number().int(),
  shareBefore: z.number(),
  shareAfter: z.number(),
  materials: z.array(
    z.object({ material: z.string(), before: z.array(unboundInterval), after: z.array(unboundInterval) }),
  ),
});
export type ImpactItem = z.infer<typeof impactItem>;
