import type { EntityManager } from '@mikro-orm/postgresql';
import { MaterialVersion } from '@/entities';
import type { FrozenMaterial } from '@/entities/run-inputs';
import { visiblePresets } from '@/src/access/policy';
import { Refusal } from '@/src/errors';
import { currentMaterials, type CurrentMaterial } from './current-materials';
import { slugByName } from './known-materials';

export type MaterialChoice = { materialId?: string; slug?: string };

/** A material by the id of one of its versions, or the newest version by slug or alias. */
export async function resolveMaterial(
  em: EntityManager,
  groupId: string | null,
  choice: MaterialChoice,
  pointer: string,
): Promise<FrozenMaterial> {
  if (choice.materialId !== undefined) {
    const version = await em.findOne(
      MaterialVersion,
      { id: choice.materialId, status: { $ne: 'draft' }, material: visiblePresets(groupId) },
      { populate: ['material'] },
    );
    if (!version) throw unknownMaterial('/materialId', choice.materialId);
    return frozenMaterial(version);
  }
  const current = await currentMaterials(em, groupId);
  return frozenMaterial(materialNamed(current, choice.slug ?? '', pointer));
}

export function materialNamed(current: Map<string, CurrentMaterial>, name: string, pointer: string): CurrentMaterial {
  const found = current.get(slugByName(current).get(name.trim().toLowerCase()) ?? '');
  if (!found) throw unknownMaterial(pointer, name);
  return found;
}

function unknownMaterial(pointer: string, name: string): Refusal {
  return new Refusal('unprocessable', `There is no material "${name}".`, [
    { pointer, detail: 'is not the slug or alias of a material' },
  ]);
}

export const frozenMaterial = (version: CurrentMaterial): FrozenMaterial => ({
  slug: version.material.slug,
  version: version.version,
  name: version.name,
  densityKgM3: version.densityKgM3,
  optics: version.optics,
  citation: version.citation,
});
