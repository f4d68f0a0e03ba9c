import { Refusal } from '@/src/errors';

export type PageRequest = { limit?: number; after?: string };
export type Page<T> = { items: T[]; next: string | null };

export const defaultPageSize = 50;

/** Where a page ended, opaque to the client. */
export const encodeCursor = (position: readonly (string | number | null)[]): string =>
  Buffer.from(JSON.stringify(position)).toString('base64url');

export function decodeCursor(cursor: string, length: number): (string | number | null)[] {
  const position = parsed(cursor);
  const valid =
    Array.isArray(position) &&
    position.length === length &&
    position.every((part) => part === null || typeof part === 'string' || typeof part === 'number');
  if (valid) return position as (string | number | null)[];
  throw new Refusal('invalid', 'The cursor `after` is not one of ours.', [
    { pointer: '/after', detail: 'is not a cursor of this list' },
  ]);
}

function parsed(cursor: string): unknown {
  try {
    return JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8'));
  } catch {
    return null;
  }
}

type Dated = { id: string; createdAt: Date };

/** Newest first, by creation and id. */
export function newestFirst(after: string | undefined) {
  if (after === undefined) return {};
  const [createdAt, id] = decodeCursor(after, 2);
  const date = new Date(String(createdAt));
  const isId = /^[0-9a-f-]{36}$/.test(String(id));
  if (Number.isNaN(date.getTime()) || !isId) throw new Refusal('invalid', 'The cursor `after` is not one of ours.');
  return { $or: [{ createdAt: { $lt: date } }, { createdAt: date, id: { $lt: String(id) } }] };
}

export const newestFirstOrder = { createdAt: 'desc', id: 'desc' } as const;

/** Takes one row more than was asked for, which tells whether there is a next page. */
export function pageOfRows<Row extends Dated, Item>(rows: Row[], limit: number, show: (row: Row) => Item): Page<Item> {
  const shown = rows.slice(0, limit);
  const last = shown.at(-1);
  const next = rows.length > limit && last ? encodeCursor([last.createdAt.toISOString(), last.id]) : null;
  return { items: shown.map(show), next };
}
