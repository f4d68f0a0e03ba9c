import type { EntityManager } from '@mikro-orm/postgresql';
import type { Actor } from '@/src/access/actor';
import { ownCatalogue } from './find-catalogues';
import { originalBytes } from './original-bytes';

export async function readOriginal(em: EntityManager, actor: Actor, id: string) {
  const catalogue = await ownCatalogue(em, actor, id);
  const { fileName, byteSize, sha256 } = catalogue;
  return { fileName, byteSize, sha256, bytes: originalBytes(em, catalogue.id) };
}
