import type { EntityManager } from '@mikro-orm/postgresql';
import { Catalogue } from '@/entities';
import { ClaimLost } from '@/src/claim';
import { copyInto } from '@/src/copy/copy-stream';
import { uuidBytes, type BinaryRows } from '@/src/copy/binary-rows';
import { knownMaterials } from '@/src/materials/known-materials';
import { CatalogueFault, readCatalogue, type GrainRow, type RejectRow } from './read-catalogue';
import { originalBytes } from './original-bytes';

export type ImportLimits = { maxRows: number };
export type ImportProgress = { claim: string; signal: AbortSignal; onRows(rows: number): void };

const keptRejects = 100_000;
const grainColumns = [
  'catalogue_id',
  'ordinal',
  'line',
  'label',
  'radius_m',
  'radius_sigma_m',
  'density_kg_m3',
  'density_sigma_kg_m3',
  'material',
  'count',
];
const rejectColumns = ['catalogue_id', 'ordinal', 'line', 'column_name', 'value', 'reason', 'raw'];

/**
 * Reads, checks and stores a catalogue in one transaction, which only commits while the claim still holds. Grains go
 * through COPY behind a savepoint, so that a catalogue which refuses bad rows keeps its list of rejects and nothing else.
 */
export async function importCatalogue(em: EntityManager, id: string, limits: ImportLimits, progress: ImportProgress) {
  const catalogue = await em.findOneOrFail(Catalogue, { id, status: 'checking' });
  const known = await knownMaterials(em, catalogue.group.id);
  const rejects: RejectRow[] = [];
  await em.transactional(async (tx) => {
    const outcome = await tx
      .transactional(async (inner) => {
        const reading = await copyGrains(inner, em, catalogue, { knownMaterials: known, ...limits }, rejects, progress);
        if (reading.rejected > 0 && catalogue.onInvalidRows === 'refuse') throw new Refused(reading);
        return { reading, failure: reading.accepted === 0 ? 'No row could be accepted.' : null };
      })
      .catch(failureOf);
    const rejectsKept = rejects.slice(0, keptRejects);
    await copyRejects(tx, id, rejectsKept);
    const { reading, failure } = outcome;
    const changed = await tx.nativeUpdate(
      Catalogue,
      { id, status: 'checking', claim: progress.claim },
      {
        status: failure === null ? 'ready' : 'failed',
        failure,
        warnings: reading?.warnings.map((warning) => warning.message) ?? [],
        materials: failure === null ? (reading?.materials ?? []) : [],
        rowsAccepted: reading?.accepted ?? 0,
        rowsRejected: reading?.rejected ?? 0,
        rowsBlank: reading?.blank ?? 0,
        rowsChecked: (reading?.accepted ?? 0) + (reading?.rejected ?? 0),
        checkedAt: new Date(),
        claim: null,
      },
    );
    if (changed === 0) throw new ClaimLost();
  });
}

type Reading = Awaited<ReturnType<typeof copyGrains>>;

class Refused extends Error {
  constructor(readonly reading: Reading) {
    super('bad rows');
  }
}

function failureOf(error: unknown): { reading: Reading | null; failure: string } {
  if (error instanceof CatalogueFault) return { reading: null, failure: error.message };
  if (!(error instanceof Refused)) throw error;
  const { rejected, accepted } = error.reading;
  const rows = rejected === 1 ? '1 row is' : `${rejected} rows are`;
  return {
    reading: error.reading,
    failure: `${rows} not valid (${accepted} would be). Correct the file, or upload it again and choose to leave bad rows out.`,
  };
}

async function copyGrains(
  tx: EntityManager,
  em: EntityManager,
  catalogue: Catalogue,
  options: Omit<Parameters<typeof readCatalogue>[1], 'mapping' | 'defaults'>,
  rejects: RejectRow[],
  progress: ImportProgress,
) {
  const id = uuidBytes(catalogue.id);
  const byMaterial = new Map<string, number>();
  const mapping = (catalogue.mapping ?? undefined) as Parameters<typeof readCatalogue>[1]['mapping'];
  const reading = await copyInto(tx, 'grain', grainColumns, ({ rows, drain }) => {
    let ordinal = 0;
    const grain = (row: GrainRow): void | Promise<void> => {
      if (rejects.length > 0 && catalogue.onInvalidRows === 'refuse') return;
      writeGrain(rows, id, ordinal++, row);
      byMaterial.set(row.material, (byMaterial.get(row.material) ?? 0) + 1);
      if (!rows.isFull) return;
      progress.onRows(ordinal);
      progress.signal.throwIfAborted();
      return drain();
    };
    const reject = (row: RejectRow) => {
      if (rejects.length <= keptRejects) rejects.push(row);
    };
    return readCatalogue(
      originalBytes(em, catalogue.id),
      { ...options, mapping, defaults: catalogue.defaults },
      { grain, reject },
    );
  });
  const materials = [...byMaterial]
    .map(([material, grains]) => ({ material, grains }))
    .sort((a, b) => b.grains - a.grains);
  return { ...reading, materials };
}

function writeGrain(rows: BinaryRows, id: Buffer, ordinal: number, grain: GrainRow): void {
  rows.row(grainColumns.length);
  rows.uuid(id);
  rows.int4(ordinal);
  rows.int4(grain.line);
  rows.text(grain.label);
  rows.float8(grain.radiusM);
  rows.float8(grain.radiusSigmaM);
  rows.float8(grain.densityKgM3);
  rows.float8(grain.densitySigmaKgM3);
  rows.text(grain.material);
  rows.float8(grain.count);
}

function copyRejects(tx: EntityManager, catalogueId: string, rejects: RejectRow[]): Promise<void> {
  const id = uuidBytes(catalogueId);
  return copyInto(tx, 'reject', rejectColumns, async ({ rows, drain }) => {
    for (const [ordinal, reject] of rejects.entries()) {
      rows.row(rejectColumns.length);
      rows.uuid(id);
      rows.int4(ordinal);
      rows.int4(reject.line);
      rows.text(reject.column);
      rows.text(reject.value);
      rows.text(reject.reason);
      rows.text(reject.raw);
      if (rows.isFull) await drain();
    }
  });
}
