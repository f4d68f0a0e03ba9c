import type { EntityManager } from '@mikro-orm/postgresql';
import type { Actor } from '@/src/access/actor';
import { sortedRows, type Condition } from '@/src/access/keyset';
import { grainConditions } from '@/src/catalogues/grain-conditions';
import { finishedRun, type FinishedRun } from './finished-run';
import { runGrainSorts, type GrainQuery } from './grain-query';
import { runGrainFrom, runGrainItemOf, runGrainSelect, type RunGrainRow } from './run-grain-row';

export async function findRunGrains(em: EntityManager, actor: Actor, id: string, query: GrainQuery) {
  return grainsOfRun(em, await finishedRun(em, actor, id), query);
}

export async function grainsOfRun(em: EntityManager, run: FinishedRun, query: GrainQuery) {
  const { sort, order, limit, after, offset } = query;
  return sortedRows(
    em,
    {
      from: runGrainFrom,
      select: runGrainSelect,
      conditions: [
        { sql: 'r.run_id = ? and g.catalogue_id = ?', values: [run.id, run.catalogue.id] },
        ...grainConditions(query),
        ...fateConditions(query),
      ],
      sortBy: runGrainSorts[sort],
      ordinal: 'r.ordinal',
      order,
      limit,
      after,
      offset,
    },
    (row) => runGrainItemOf(row as unknown as RunGrainRow),
  );
}

function fateConditions({ fate, betaMin, betaMax }: GrainQuery): Condition[] {
  const conditions: Condition[] = [];
  if (fate !== undefined) conditions.push({ sql: 'r.is_unbound = ?', values: [fate === 'unbound'] });
  if (betaMin !== undefined) conditions.push({ sql: 'r.beta >= ?', values: [betaMin] });
  if (betaMax !== undefined) conditions.push({ sql: 'r.beta <= ?', values: [betaMax] });
  return conditions;
}
