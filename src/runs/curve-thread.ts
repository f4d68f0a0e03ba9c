import { buildCurve, encodeCurve } from '@/src/physics/curve';
import { buildEmission } from '@/src/physics/temperature';
import type { CurveIngredients } from './curve-ingredients';

/** Runs in a thread of its own, bundled for plain Node by src/ops/thread-bundle.mjs. */
export const curve = ({ recipe, spectrum }: CurveIngredients): Uint8Array => encodeCurve(buildCurve(recipe, spectrum));

export const emission = ({ recipe }: Pick<CurveIngredients, 'recipe'>) => buildEmission(recipe);
