import { z } from 'zod';

export const materialItem = z.object({
  id: z.uuid().describe('Id of this version'),
  slug: z.string(),
  version: z.number().int(),
  name: z.string(),
  formula: z.string(),
  aliases: z.array(z.string()),
  densityGCm3: z.number(),
  densitySource: z.string(),
  validUm: z
    .tuple([z.number(), z.number()])
    .describe('Wavelengths over which the constants were fitted to measurements, um'),
  citation: z.string(),
  note: z.string(),
  status: z.enum(['draft', 'published', 'retired']),
  ownedBy: z.enum(['everybody', 'group']),
});
export type MaterialItem = z.infer<typeof materialItem>;
