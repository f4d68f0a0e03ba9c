import { z } from 'zod';

export const starNumbers = z.strictObject({
  massSun: z.number('must be a number').min(0.05).max(100).describe('Mass in nominal solar masses'),
  luminositySun: z.number('must be a number').min(1e-5).max(1e6).describe('Luminosity in nominal solar luminosities'),
  teffK: z
    .number('must be a number')
    .min(2000)
    .max(60000)
    .describe('Effective temperature in K; sets the black-body spectrum'),
});
export type StarNumbers = z.infer<typeof starNumbers>;

export const starItem = z.object({
  id: z.uuid().describe('Id of this version'),
  slug: z.string(),
  version: z.number().int(),
  name: z.string(),
  spectralType: z.string().nullable(),
  massSun: z.number(),
  luminositySun: z.number(),
  teffK: z.number(),
  radiusSun: z.number().nullable(),
  spectrum: z.enum(['blackbody', 'table']),
  citation: z.string(),
  note: z.string(),
  status: z.enum(['draft', 'published', 'retired']),
  ownedBy: z.enum(['everybody', 'group']),
});
export type StarItem = z.infer<typeof starItem>;
