import { z } from 'zod';

const day = z.iso.date();

export const changeSearch = z.object({
  person: z.string().trim().max(200).optional(),
  action: z.string().trim().max(60).optional(),
  target: z.string().trim().max(300).optional(),
  from: day.optional(),
  to: day.optional(),
});
export type ChangeSearch = z.infer<typeof changeSearch>;

export const changeItem = z.object({
  id: z.uuid(),
  at: z.iso.datetime(),
  person: z.string(),
  action: z.string(),
  kind: z.string(),
  targetId: z.string(),
  target: z.string(),
  before: z.record(z.string(), z.unknown()).nullable(),
  after: z.record(z.string(), z.unknown()).nullable(),
});
export type ChangeItem = Omit<z.infer<typeof changeItem>, 'before' | 'after'> & {
  before: object | null;
  after: object | null;
};
