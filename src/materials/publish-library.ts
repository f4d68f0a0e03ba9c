import type { EntityManager } from '@mikro-orm/postgresql';
import { Material, MaterialVersion } from '@/entities';
import { opticsFromLibraryEntry } from '@/src/physics/materials';
import type { LibraryMaterial } from '@/fixtures/materials/library';

/** Puts the materials that come with the product in place; one that is there is left as it is. */
export async function publishShippedMaterials(em: EntityManager, library: readonly LibraryMaterial[]): Promise<void> {
  await em.transactional(async (tx) => {
    const present = new Set((await tx.find(Material, { group: null })).map(({ slug }) => slug));
    for (const entry of library) {
      if (present.has(entry.id)) continue;
      const material = tx.create(Material, { slug: entry.id, aliases: entry.aliases });
      tx.create(MaterialVersion, {
        material,
        version: 1,
        status: 'published',
        publishedAt: new Date(),
        name: entry.name,
        formula: entry.formula,
        densityKgM3: entry.density_g_cm3 * 1000,
        densitySource: entry.density_source,
        optics: opticsFromLibraryEntry(entry),
        validFromUm: entry.valid_um[0],
        validToUm: entry.valid_um[1],
        citation: entry.citation,
        note: entry.note,
      });
    }
  });
}
