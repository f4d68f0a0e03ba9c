import { z } from 'zod';

export const shareRequest = z.strictObject({
  expiresInDays: z
    .number()
    .int()
    .min(1)
    .max(365)
    .default(30)
    .describe('How long the link works, 30 days when left out'),
  passphrase: z.string().min(8).max(200).optional().describe('Asked for before anything is shown'),
  mayDownload: z.boolean().default(false).describe('Whether the grains may be downloaded as CSV'),
});
export type ShareRequest = z.output<typeof shareRequest>;

export const newShare = z.object({
  id: z.uuid(),
  url: z.string().describe('The link: it is shown this once'),
  expiresAt: z.iso.datetime(),
});

export const shareItem = z.object({
  id: z.uuid(),
  createdBy: z.string(),
  createdAt: z.iso.datetime(),
  expiresAt: z.iso.datetime(),
  state: z.enum(['open', 'expired', 'revoked']),
  hasPassphrase: z.boolean(),
  mayDownload: z.boolean(),
  views: z.number().int(),
});
export type ShareItem = z.infer<typeof shareItem>;
