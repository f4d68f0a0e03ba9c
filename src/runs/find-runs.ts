import type { EntityManager, Loaded } from '@mikro-orm/postgresql';
import { Run } from '@/entities';
import type { Actor } from '@/src/access/actor';
import {
  defaultPageSize,
  newestFirst,
  newestFirstOrder,
  pageOfRows,
  type Page,
  type PageRequest,
} from '@/src/access/page';
import { demand, ofOwnGroup } from '@/src/access/policy';
import { notFound } from '@/src/errors';
import type { RunItem } from './schema';

type RunsWanted = PageRequest & { catalogueId?: string };

export async function listRuns(
  em: EntityManager,
  actor: Actor,
  { limit = defaultPageSize, after, catalogueId }: RunsWanted = {},
): Promise<Page<RunItem>> {
  demand(actor, 'run.read');
  const rows = await em.find(
    Run,
    { ...ofOwnGroup(actor), ...(catalogueId === undefined ? {} : { catalogue: catalogueId }), ...newestFirst(after) },
    { orderBy: newestFirstOrder, limit: limit + 1, populate: ['requestedBy'], exclude: ['histograms'] },
  );
  return pageOfRows(rows as RunRow[], limit, ownItem);
}

export async function findRun(em: EntityManager, actor: Actor, id: string): Promise<RunItem> {
  return ownItem(await ownRun(em, actor, id));
}

export async function ownRun(em: EntityManager, actor: Actor, id: string): Promise<RunRow> {
  demand(actor, 'run.read');
  const row = await em.findOne(Run, { id, ...ofOwnGroup(actor) }, { populate: ['requestedBy'], refresh: true });
  if (!row) throw notFound('run');
  return row;
}

export type RunRow = Loaded<Run, 'requestedBy'>;

const ownItem = (row: RunRow): RunItem => runItemOf(row, row.requestedBy.name);

export function runItemOf(row: Run, requestedBy: string): RunItem {
  return {
    id: row.id,
    name: row.name,
    status: row.status,
    progress: row.progress,
    stage: row.stage,
    error: row.error ?? null,
    inputs: row.inputs as unknown as Record<string, unknown>,
    summary: row.summary ?? null,
    engineVersion: row.engineVersion,
    resultSha256: row.resultSha256 ?? null,
    requestedBy,
    createdAt: row.createdAt.toISOString(),
    startedAt: row.startedAt?.toISOString() ?? null,
    finishedAt: row.finishedAt?.toISOString() ?? null,
  };
}
