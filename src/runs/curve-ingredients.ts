import { createHash } from 'node:crypto';
import type { FrozenMaterial, FrozenStar, RunOptics } from '@/entities/run-inputs';
import { ENGINE_VERSION } from '@/src/physics/engine-version';
import type { Optics, OpticsRecipe } from '@/src/physics/optics';
import type { Spectrum } from '@/src/physics/spectrum';

/** Everything a curve depends on beside the engine. */
export type CurveIngredients = { recipe: OpticsRecipe; spectrum: Spectrum };

export const spectrumOf = ({ spectrum, teffK }: FrozenStar): Spectrum =>
  spectrum ? { kind: 'table', ...spectrum } : { kind: 'planck', teffK };

/** What a grain of this material is made of; `porosity` is the grain's own. */
export function recipeOf(
  core: FrozenMaterial,
  optics: RunOptics,
  materials: FrozenMaterial[],
  porosity: number,
): OpticsRecipe {
  const recipe: OpticsRecipe = { core: core.optics as Optics };
  if (porosity > 0) Object.assign(recipe, { porosity, mixing: optics.mixing ?? 'bruggeman' });
  if (!optics.mantle) return recipe;
  const { material, volumeFraction } = optics.mantle;
  const mantle = materials.find(({ slug }) => slug === material);
  if (!mantle) throw new Error(`the mantle material ${material} is not among the frozen ones`);
  return { ...recipe, mantle: { optics: mantle.optics as Optics, volumeFraction } };
}

/** SHA-256 over the ingredients and the engine version: equal keys mean equal bits. */
export function curveKey(ingredients: CurveIngredients): string {
  return createHash('sha256')
    .update(JSON.stringify(sorted({ engine: ENGINE_VERSION, ...ingredients })))
    .digest('hex');
}

/** The database gives back JSON with its keys in another order. */
function sorted(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(sorted);
  if (value === null || typeof value !== 'object') return value;
  const entries = Object.entries(value).sort(([a], [b]) => (a < b ? -1 : 1));
  return Object.fromEntries(entries.map(([key, part]) => [key, sorted(part)]));
}
