'use client';

import { useEffect, useState } from 'react';
import type { ColumnMapping } from '@/src/catalogues/mapping';
import { previewCatalogue, type CataloguePreview } from '@/src/catalogues/preview-catalogue';
import type { MaterialItem } from '@/src/materials/schema';

const previewBytes = 256 * 1024;

export type PreviewDefaults = { densityGCm3?: number; material?: string };

/** What the first 256 KB of the chosen file would become; read anew when the mapping or a default changes. */
export function usePreview(
  file: File | null,
  mapping: ColumnMapping,
  defaults: PreviewDefaults,
  materials: readonly MaterialItem[],
): CataloguePreview | null {
  const [preview, setPreview] = useState<{ of: File; found: CataloguePreview } | null>(null);
  useEffect(() => {
    if (!file) return;
    let isStale = false;
    void file
      .slice(0, previewBytes)
      .arrayBuffer()
      .then((buffer) => {
        if (isStale) return;
        const found = previewCatalogue(new Uint8Array(buffer), {
          mapping: Object.keys(mapping).length > 0 ? mapping : undefined,
          defaults,
          ...namesOf(materials),
          isWholeFile: file.size <= previewBytes,
        });
        setPreview({ of: file, found });
      });
    return () => {
      isStale = true;
    };
  }, [file, mapping, defaults, materials]);
  return preview && preview.of === file ? preview.found : null;
}

function namesOf(materials: readonly MaterialItem[]) {
  const knownMaterials = new Map<string, string>();
  for (const { slug, name, aliases } of materials) {
    for (const alias of [name, ...aliases]) knownMaterials.set(alias.toLowerCase(), slug);
  }
  for (const { slug } of materials) knownMaterials.set(slug, slug);
  return {
    knownMaterials,
    materialDensityKgM3: new Map(materials.map(({ slug, densityGCm3 }) => [slug, densityGCm3 * 1000])),
  };
}
