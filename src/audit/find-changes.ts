import type { EntityManager, FilterQuery } from '@mikro-orm/postgresql';
import { ChangeRecord } from '@/entities';
import type { Actor } from '@/src/access/actor';
import { newestFirst, newestFirstOrder, pageOfRows, type Page } from '@/src/access/page';
import { demand, ofOwnGroup } from '@/src/access/policy';
import { csvLine } from '@/src/csv-line';
import type { ChangeItem, ChangeSearch } from './schema';

const perPage = 50;
const linesAtOnce = 1000;

/** Admins see every change, a principal investigator those of the own group. */
export async function findChanges(
  em: EntityManager,
  actor: Actor,
  search: ChangeSearch,
  after?: string,
): Promise<Page<ChangeItem>> {
  demand(actor, 'changes.read');
  const rows = await em.find(
    ChangeRecord,
    { $and: [seenBy(actor), matching(search), newestFirst(after)] },
    { orderBy: newestFirstOrder, limit: perPage + 1 },
  );
  return pageOfRows(rows, perPage, itemOf);
}

const header = ['time', 'person', 'action', 'kind', 'id', 'name', 'before', 'after'];

export function changesCsv(em: EntityManager, actor: Actor, search: ChangeSearch): AsyncGenerator<string> {
  demand(actor, 'changes.read');
  return lines(em, actor, search);
}

async function* lines(em: EntityManager, actor: Actor, search: ChangeSearch): AsyncGenerator<string> {
  yield csvLine(header);
  let after: string | undefined;
  do {
    const rows = await em
      .fork()
      .find(
        ChangeRecord,
        { $and: [seenBy(actor), matching(search), newestFirst(after)] },
        { orderBy: newestFirstOrder, limit: linesAtOnce + 1 },
      );
    const page = pageOfRows(rows, linesAtOnce, itemOf);
    yield page.items
      .map((item) =>
        csvLine([
          item.at,
          item.person,
          item.action,
          item.kind,
          item.targetId,
          item.target,
          text(item.before),
          text(item.after),
        ]),
      )
      .join('');
    after = page.next ?? undefined;
  } while (after);
}

const text = (value: object | null) => (value === null ? null : JSON.stringify(value));

const seenBy = (actor: Actor): FilterQuery<ChangeRecord> =>
  actor.platformRole === 'admin' ? {} : { groupId: ofOwnGroup(actor).group };

function matching({ person, action, target, from, to }: ChangeSearch): FilterQuery<ChangeRecord> {
  const contains = (part: string) => ({ $ilike: `%${part.replace(/[\\%_]/g, '\\$&')}%` });
  const conditions: FilterQuery<ChangeRecord>[] = [];
  if (person) conditions.push({ personName: contains(person) });
  if (action) conditions.push({ action: contains(action) });
  if (target) conditions.push({ targetName: contains(target) });
  if (from) conditions.push({ createdAt: { $gte: new Date(`${from}T00:00:00Z`) } });
  if (to) conditions.push({ createdAt: { $lt: new Date(Date.parse(`${to}T00:00:00Z`) + 86_400_000) } });
  return conditions.length > 0 ? { $and: conditions } : {};
}

const itemOf = (row: ChangeRecord): ChangeItem => ({
  id: row.id,
  at: row.createdAt.toISOString(),
  person: row.personName,
  action: row.action,
  kind: row.targetKind,
  targetId: row.targetId,
  target: row.targetName,
  before: row.before ?? null,
  after: row.after ?? null,
});
