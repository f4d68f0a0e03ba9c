import type { z } from 'zod';
import { refusalOfZod } from './problem';

export function parseForm<T extends z.ZodType>(schema: T, form: FormData): z.output<T> {
  const parsed = schema.safeParse(Object.fromEntries(form.entries()));
  if (!parsed.success) throw refusalOfZod(parsed.error, 'form');
  return parsed.data;
}
