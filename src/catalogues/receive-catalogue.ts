import type { EntityManager } from '@mikro-orm/postgresql';
import { createReadStream } from 'node:fs';
import { Catalogue, CatalogueChunk } from '@/entities';
import type { CatalogueDefaults, CatalogueMapping, InvalidRowRule } from '@/entities/catalogue';
import type { Actor } from '@/src/access/actor';
import { demand } from '@/src/access/policy';
import { recordChange } from '@/src/audit/record-change';
import { Refusal } from '@/src/errors';
import { enqueue, queues } from '@/src/queue';
import type { Spooled } from './spool';

export type UploadedCatalogue = {
  file: Spooled;
  fileName: string;
  name: string;
  mapping: CatalogueMapping | null;
  defaults: CatalogueDefaults;
  onInvalidRows: InvalidRowRule;
};

const chunkBytes = 1024 * 1024;

/** Keeps the very bytes and asks for the check, both in one transaction. */
export async function receiveCatalogue(em: EntityManager, actor: Actor, upload: UploadedCatalogue) {
  demand(actor, 'catalogue.upload');
  const { file } = upload;
  if (file.byteSize === 0) {
    throw new Refusal('invalid', 'The file is empty.', [{ pointer: '/file', detail: 'has no bytes' }]);
  }
  return em.transactional(async (tx) => {
    const catalogue = tx.create(Catalogue, {
      group: actor.groupId!,
      uploadedBy: actor.personId,
      name: upload.name,
      fileName: upload.fileName,
      byteSize: file.byteSize,
      sha256: file.sha256,
      mapping: upload.mapping,
      defaults: upload.defaults,
      onInvalidRows: upload.onInvalidRows,
      status: 'checking',
      warnings: [],
      materials: [],
    });
    await tx.flush();
    recordChange(tx, actor, {
      action: 'catalogue.upload',
      target: { kind: 'catalogue', id: catalogue.id, name: upload.name },
      groupId: actor.groupId,
      after: { fileName: upload.fileName, sha256: file.sha256 },
    });
    let ordinal = 0;
    for await (const bytes of createReadStream(file.path, { highWaterMark: chunkBytes })) {
      await tx.insert(CatalogueChunk, { catalogue: catalogue.id, ordinal: ordinal++, bytes: bytes as Buffer });
    }
    await enqueue(tx, queues.importCatalogue, catalogue.id);
    return { id: catalogue.id, status: catalogue.status };
  });
}
