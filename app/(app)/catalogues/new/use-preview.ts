'use client';

import { useEffect, useState } from 'react';
import type { ColumnMapping } from '@/src/catalogues/mapping';
import { previewCatalogue, type CataloguePreview } from '@/src/catalogues/preview-catalogue';
import type { MaterialItem } from '@/src/materials/schema';

const previewBytes = 256 * 1024;

export type PreviewDefaults = { densityGCm3?: number; material?: string };

const unreadable: CataloguePreview = {
  delimiter: null,
  columns: [],
  rows: [],
  fault: 'The file could not be opened. It may have been moved or changed: choose it again.',
  accepted: [],
  problems: [],
  warnings: [],
};

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
    const show = (found: CataloguePreview) => {
      if (!isStale) setPreview({ of: file, found });
    };
    const options = {
      mapping: Object.keys(mapping).length > 0 ? mapping : undefined,
      defaults,
      knownMaterials: namesOf(materials),
      isWholeFile: file.size <= previewBytes,
    };
    const beginning = file.slice(0, previewBytes).arrayBuffer();
    void beginning.then(
      (buffer) => show(previewCatalogue(new Uint8Array(buffer), options)),
      () => show(unreadable),
    );
    return () => {
      isStale = true;
    };
  }, [file, mapping, defaults, materials]);
  return preview && preview.of === file ? preview.found : null;
}

function namesOf(materials: readonly MaterialItem[]): Map<string, string> {
  const knownMaterials = new Map<string, string>();
  for (const { slug, name, aliases } of materials) {
    for (const alias of [name, ...aliases]) knownMaterials.set(alias.toLowerCase(), slug);
  }
  for (const { slug } of materials) knownMaterials.set(slug, slug);
  return knownMaterials;
}
