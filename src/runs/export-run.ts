import type { EntityManager } from '@mikro-orm/postgresql';
import type { Actor } from '@/src/access/actor';
import { csvLine } from '@/src/csv-line';
import { finishedRun, type FinishedRun } from './finished-run';
import { runGrainFrom, runGrainItemOf, runGrainSelect, type RunGrainRow } from './run-grain-row';
import type { RunGrainItem } from './schema';

const columns = {
  ordinal: 'ordinal',
  label: 'label',
  material: 'material',
  radiusUm: 'radius_um',
  densityGCm3: 'density_g_cm3',
  count: 'count',
  qpr: 'q_pr',
  beta: 'beta',
  pUnbound: 'p_unbound',
  fate: 'fate',
  regime: 'regime',
  prTimeYr: 'pr_time_yr',
  collisionTimeYr: 'collision_time_yr',
  semiMajorAxisAu: 'semi_major_axis_au',
  eccentricity: 'eccentricity',
  vInfKmS: 'v_inf_km_s',
  temperatureK: 'temperature_k',
  lorentzRatio: 'lorentz_ratio',
} as const satisfies Record<keyof RunGrainItem, string>;

const fields = Object.keys(columns) as (keyof RunGrainItem)[];
const rowsAtOnce = 2000;

export type RunExport = { name: string; lines: AsyncGenerator<string> };

/** All grains of a run as CSV, piece by piece. */
export async function exportRun(em: EntityManager, actor: Actor, id: string): Promise<RunExport> {
  return exportOfRun(em, await finishedRun(em, actor, id));
}

export const exportOfRun = (em: EntityManager, run: FinishedRun): RunExport => ({
  name: run.name,
  lines: csvOf(em, run.id, run.catalogue.id),
});

async function* csvOf(em: EntityManager, runId: string, catalogueId: string): AsyncGenerator<string> {
  yield csvLine(Object.values(columns));
  let ordinal = -1;
  while (true) {
    const rows = await em.getConnection().execute<RunGrainRow[]>(
      `select ${runGrainSelect} from ${runGrainFrom} where r.run_id = ? and g.catalogue_id = ? and r.ordinal > ?
       order by r.ordinal limit ?`,
      [runId, catalogueId, ordinal, rowsAtOnce],
    );
    if (rows.length === 0) return;
    yield rows.map((row) => lineOf(runGrainItemOf(row))).join('');
    ordinal = rows[rows.length - 1].ordinal;
  }
}

const lineOf = (item: RunGrainItem) => csvLine(fields.map((field) => item[field]));
