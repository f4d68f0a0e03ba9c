import type { EntityManager, Loaded } from '@mikro-orm/postgresql';
import { Catalogue } from '@/entities';
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
import type { CatalogueItem } from './schema';

export async function listCatalogues(
  em: EntityManager,
  actor: Actor,
  { limit = defaultPageSize, after }: PageRequest = {},
): Promise<Page<CatalogueItem>> {
  demand(actor, 'catalogue.read');
  const rows = await em.find(
    Catalogue,
    { ...ofOwnGroup(actor), ...newestFirst(after) },
    { orderBy: newestFirstOrder, limit: limit + 1, populate: ['uploadedBy'] },
  );
  return pageOfRows(rows, limit, catalogueItemOf);
}

export async function findCatalogue(em: EntityManager, actor: Actor, id: string): Promise<CatalogueItem> {
  return catalogueItemOf(await ownCatalogue(em, actor, id));
}

export async function ownCatalogue(em: EntityManager, actor: Actor, id: string) {
  demand(actor, 'catalogue.read');
  const row = await em.findOne(Catalogue, { id, ...ofOwnGroup(actor) }, { populate: ['uploadedBy'] });
  if (!row) throw notFound('catalogue');
  return row;
}

function catalogueItemOf(row: Loaded<Catalogue, 'uploadedBy'>): CatalogueItem {
  return {
    id: row.id,
    name: row.name,
    fileName: row.fileName,
    status: row.status,
    failure: row.failure ?? null,
    warnings: row.warnings,
    rows: { accepted: row.rowsAccepted, rejected: row.rowsRejected, blank: row.rowsBlank, checked: row.rowsChecked },
    materials: row.materials,
    onInvalidRows: row.onInvalidRows,
    sha256: row.sha256,
    byteSize: row.byteSize,
    uploadedBy: row.uploadedBy.name,
    createdAt: row.createdAt.toISOString(),
    checkedAt: row.checkedAt?.toISOString() ?? null,
  };
}
