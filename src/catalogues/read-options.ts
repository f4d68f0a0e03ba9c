import { CatalogueFault } from './catalogue-fault';
import type { ColumnMapping } from './mapping';
import { findMaterial, unknownMaterialReason } from './material-name';

export type ReadOptions = {
  mapping?: ColumnMapping;
  defaults?: { densityGCm3?: number; material?: string };
  /** Slug or alias, in lower case -> slug. */
  knownMaterials: ReadonlyMap<string, string>;
  maxRows: number;
};

export function defaultMaterial(options: ReadOptions): string | null {
  const name = options.defaults?.material;
  if (name === undefined) return null;
  const slug = findMaterial(name, options.knownMaterials);
  if (slug) return slug;
  throw new CatalogueFault(
    'defaults',
    `The default material "${name}" ${unknownMaterialReason(options.knownMaterials, name)}.`,
  );
}

export function defaultDensityKgM3(options: ReadOptions): number | null {
  const densityGCm3 = options.defaults?.densityGCm3;
  if (densityGCm3 === undefined) return null;
  if (densityGCm3 > 0 && densityGCm3 <= 25) return densityGCm3 * 1000;
  throw new CatalogueFault('defaults', `The default density ${densityGCm3} g/cm3 is not between 0 and 25.`);
}
