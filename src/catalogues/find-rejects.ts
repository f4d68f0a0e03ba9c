import type { EntityManager } from '@mikro-orm/postgresql';
import { Reject } from '@/entities';
import type { Actor } from '@/src/access/actor';
import { decodeCursor, defaultPageSize, encodeCursor, type Page, type PageRequest } from '@/src/access/page';
import { ownCatalogue } from './find-catalogues';
import { rejectsCsvHeader, rejectToCsvLine } from './rejects-csv';
import type { RejectItem } from './schema';

export async function listRejects(
  em: EntityManager,
  actor: Actor,
  id: string,
  { limit = defaultPageSize, after }: PageRequest = {},
): Promise<Page<RejectItem> & { total: number }> {
  const catalogue = await ownCatalogue(em, actor, id);
  const from = after === undefined ? -1 : Number(decodeCursor(after, 1)[0]);
  const [rows, total] = await Promise.all([
    rejectsBeyond(em, catalogue.id, Number.isInteger(from) ? from : -1, limit + 1),
    em.fork().count(Reject, { catalogue: catalogue.id }),
  ]);
  const shown = rows.slice(0, limit);
  const last = shown.at(-1);
  const next = rows.length > limit && last ? encodeCursor([last.ordinal]) : null;
  const items = shown.map(({ ordinal, line, column, value, reason, raw }) => ({
    ordinal,
    line,
    column: column ?? null,
    value: value ?? null,
    reason,
    raw,
  }));
  return { items, next, total };
}

const rejectsBeyond = (em: EntityManager, catalogue: string, ordinal: number, limit: number) =>
  em.find(
    Reject,
    { catalogue, ordinal: { $gt: ordinal } },
    { orderBy: { ordinal: 'asc' }, limit, disableIdentityMap: true },
  );

const linesAtOnce = 2000;

/** All rejects as CSV, piece by piece. */
export async function rejectsCsv(
  em: EntityManager,
  actor: Actor,
  id: string,
): Promise<{ name: string; lines: AsyncGenerator<string> }> {
  const catalogue = await ownCatalogue(em, actor, id);
  return { name: catalogue.name, lines: csvOf(em, catalogue.id) };
}

async function* csvOf(em: EntityManager, catalogueId: string): AsyncGenerator<string> {
  yield rejectsCsvHeader;
  let ordinal = -1;
  while (true) {
    const rows = await rejectsBeyond(em, catalogueId, ordinal, linesAtOnce);
    if (rows.length === 0) return;
    yield rows
      .map(({ line, column, value, reason, raw }) =>
        rejectToCsvLine({ line, column: column ?? null, value: value ?? null, reason, raw }),
      )
      .join('');
    ordinal = rows[rows.length - 1].ordinal;
  }
}
