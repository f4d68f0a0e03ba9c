import type { EntityManager } from '@mikro-orm/postgresql';
import { CatalogueChunk } from '@/entities';

/** The uploaded bytes, piece by piece. */
export async function* originalBytes(em: EntityManager, catalogueId: string): AsyncGenerator<Uint8Array> {
  for (let ordinal = 0; ; ordinal += 1) {
    const chunk = await em.fork().findOne(CatalogueChunk, { catalogue: catalogueId, ordinal });
    if (!chunk) return;
    yield chunk.bytes;
  }
}
