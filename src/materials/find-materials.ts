import type { EntityManager } from '@mikro-orm/postgresql';
import type { Actor } from '@/src/access/actor';
import type { Page } from '@/src/access/page';
import { demand } from '@/src/access/policy';
import { currentMaterials, type CurrentMaterial } from './current-materials';
import type { MaterialItem } from './schema';

export async function listMaterials(em: EntityManager, actor: Actor): Promise<Page<MaterialItem>> {
  demand(actor, 'material.read');
  const current = await currentMaterials(em, actor.groupId);
  const items = [...current.values()].map(materialItemOf).sort((a, b) => a.name.localeCompare(b.name, 'en'));
  return { items, next: null };
}

export function materialItemOf(version: CurrentMaterial): MaterialItem {
  return {
    id: version.id,
    slug: version.material.slug,
    version: version.version,
    name: version.name,
    formula: version.formula,
    aliases: version.material.aliases,
    densityGCm3: version.densityKgM3 / 1000,
    densitySource: version.densitySource,
    validUm: [version.validFromUm, version.validToUm],
    citation: version.citation,
    note: version.note,
    status: version.status,
    ownedBy: version.material.group === null ? 'everybody' : 'group',
  };
}
