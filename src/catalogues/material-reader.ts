import type { PlannedColumn } from './column-plan';
import { findMaterial, unknownMaterialReason } from './material-name';
import { defaultMaterial, type ReadOptions } from './read-options';

type Refuse = (column: string | null, value: string | null, reason: string) => void;

/** A file that is wrong throughout repeats the same few unknown names; the search for near names is done once for each. */
const rememberedNames = 1000;

export function materialReader(column: PlannedColumn | null, options: ReadOptions) {
  const fallback = defaultMaterial(options);
  const slugs = new Map<string, string>();
  const reasons = new Map<string, string>();

  return (cells: readonly string[], refuse: Refuse): string | null => {
    const cell = column ? cells[column.index] : '';
    const remembered = slugs.get(cell);
    if (remembered !== undefined) return remembered;
    if (cell.trim() === '') {
      if (fallback === null) refuse(column?.header ?? null, null, 'no material, and no default material was given');
      return fallback;
    }
    const slug = findMaterial(cell, options.knownMaterials);
    if (slug !== null) {
      if (slugs.size < rememberedNames) slugs.set(cell, slug);
      return slug;
    }
    const reason = reasons.get(cell) ?? unknownMaterialReason(options.knownMaterials, cell);
    if (reasons.size < rememberedNames) reasons.set(cell, reason);
    refuse(column?.header ?? null, cell, reason);
    return null;
  };
}
