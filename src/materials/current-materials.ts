import type { EntityManager, Loaded } from '@mikro-orm/postgresql';
import { MaterialVersion } from '@/entities';
import { visiblePresets } from '@/src/access/policy';

export type CurrentMaterial = Loaded<MaterialVersion, 'material'>;

/** The newest published version of every material that the group may see, by slug; a group's own goes before everybody's. */
export async function currentMaterials(
  em: EntityManager,
  groupId: string | null,
): Promise<Map<string, CurrentMaterial>> {
  const versions = await em.find(
    MaterialVersion,
    { status: 'published', material: visiblePresets(groupId) },
    { populate: ['material'], orderBy: { version: 'asc' } },
  );
  const ownLast = versions.sort((a, b) => Number(a.material.group !== null) - Number(b.material.group !== null));
  return new Map(ownLast.map((version) => [version.material.slug, version]));
}
