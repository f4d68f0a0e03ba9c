import type { EntityManager } from '@mikro-orm/postgresql';
import { decodeCurve, type Curve } from '@/src/physics/curve';
import { curveKey, type CurveIngredients } from './curve-ingredients';
import { curveInThread } from './curve-threads';
import { keptCurve } from './obtain-curve';

const most = 64;
const recent = new Map<string, Promise<Curve>>();

/** For the calculator: what was asked for lately is kept in memory, nothing is stored. */
export function recentCurve(em: EntityManager, ingredients: CurveIngredients): Promise<Curve> {
  const key = curveKey(ingredients);
  const curve = recent.get(key) ?? build(em, key, ingredients);
  recent.delete(key);
  recent.set(key, curve);
  for (const oldest of recent.keys()) {
    if (recent.size <= most) break;
    recent.delete(oldest);
  }
  return curve;
}

async function build(em: EntityManager, key: string, ingredients: CurveIngredients): Promise<Curve> {
  try {
    return (await keptCurve(em, key)) ?? decodeCurve(await curveInThread(ingredients));
  } catch (error) {
    recent.delete(key);
    throw error;
  }
}
