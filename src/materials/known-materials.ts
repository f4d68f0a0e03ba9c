import type { EntityManager } from '@mikro-orm/postgresql';
import { currentMaterials, type CurrentMaterial } from './current-materials';

/** Slug or alias in lower case -> slug, and the density of each slug: what the reader of a catalogue needs to know. */
export async function knownMaterials(em: EntityManager, groupId: string) {
  const current = await currentMaterials(em, groupId);
  return {
    knownMaterials: slugByName(current),
    materialDensityKgM3: new Map([...current].map(([slug, version]) => [slug, version.densityKgM3])),
  };
}

export function slugByName(current: Map<string, CurrentMaterial>): Map<string, string> {
  const names = new Map<string, string>();
  for (const [slug, { name, material }] of current)
    for (const alias of [name, ...material.aliases]) names.set(alias.toLowerCase(), slug);
  for (const slug of current.keys()) names.set(slug.toLowerCase(), slug);
  return names;
}
