import type { EntityManager } from '@mikro-orm/postgresql';
import { currentMaterials, type CurrentMaterial } from './current-materials';

/** Slug, name or alias in lower case -> slug: what the reader of a catalogue needs to know. */
export async function knownMaterials(em: EntityManager, groupId: string): Promise<Map<string, string>> {
  return slugByName(await currentMaterials(em, groupId));
}

export function slugByName(current: Map<string, CurrentMaterial>): Map<string, string> {
  const names = new Map<string, string>();
  for (const [slug, { name, material }] of current)
    for (const alias of [name, ...material.aliases]) names.set(alias.toLowerCase(), slug);
  for (const slug of current.keys()) names.set(slug.toLowerCase(), slug);
  return names;
}
