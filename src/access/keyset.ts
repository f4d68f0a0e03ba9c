import type { EntityManager } from '@mikro-orm/postgresql';
import { decodeCursor, encodeCursor, type Page } from './page';

/** A filter: SQL of our own with ? for each value, and the values. */
export type Condition = { sql: string; values: unknown[] };

export type SortedRows = {
  /** Everything from `from` on, without conditions. */
  from: string;
  select: string;
  conditions: Condition[];
  /** The column or expression sorted by, and the one that makes the order total. Both are our own words, never input. */
  sortBy: string;
  ordinal: string;
  order: 'asc' | 'desc';
  limit: number;
  after?: string;
  offset?: number;
};

type Row = Record<string, unknown> & { sort_key: string | number | null; ordinal: number };

/** A page of rows in any order, by keyset (or offset, for a grid that jumps); rows without the sorted value come last. */
export async function sortedRows<Item>(
  em: EntityManager,
  wanted: SortedRows,
  show: (row: Row) => Item,
): Promise<Page<Item> & { total: number }> {
  const { conditions, limit, after } = wanted;
  const total = await countRows(em, wanted.from, conditions);
  const all = after === undefined ? conditions : [...conditions, beyond(wanted, after)];
  const { sql, values } = joined(all);
  const rows = await em.getConnection().execute<Row[]>(
    `select ${wanted.select}, ${wanted.sortBy} as sort_key, ${wanted.ordinal} as ordinal from ${wanted.from} where ${sql}
     order by ${wanted.sortBy} ${wanted.order} nulls last, ${wanted.ordinal} limit ? offset ?`,
    [...values, limit + 1, after === undefined ? (wanted.offset ?? 0) : 0],
  );
  const shown = rows.slice(0, limit);
  const last = shown.at(-1);
  const next = rows.length > limit && last ? encodeCursor([last.sort_key, last.ordinal]) : null;
  return { items: shown.map(show), next, total };
}

export async function countRows(em: EntityManager, from: string, conditions: Condition[]): Promise<number> {
  const { sql, values } = joined(conditions);
  const [{ total }] = await em
    .getConnection()
    .execute<[{ total: number }]>(`select count(*)::int as total from ${from} where ${sql}`, values);
  return total;
}

export function joined(conditions: Condition[]): Condition {
  return {
    sql: conditions.map(({ sql }) => `(${sql})`).join(' and '),
    values: conditions.flatMap(({ values }) => values),
  };
}

function beyond({ sortBy, ordinal, order }: SortedRows, after: string): Condition {
  const [key, at] = decodeCursor(after, 2);
  const position = typeof at === 'number' && Number.isInteger(at) ? at : -1;
  if (key === null) return { sql: `${sortBy} is null and ${ordinal} > ?`, values: [position] };
  const further = order === 'asc' ? '>' : '<';
  return {
    sql: `${sortBy} ${further} ? or (${sortBy} = ? and ${ordinal} > ?) or ${sortBy} is null`,
    values: [key, key, position],
  };
}
