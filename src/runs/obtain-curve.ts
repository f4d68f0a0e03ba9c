import type { EntityManager } from '@mikro-orm/postgresql';
import { Curve as KeptCurve } from '@/entities';
import { decodeCurve, type Curve } from '@/src/physics/curve';
import { ENGINE_VERSION } from '@/src/physics/engine-version';
import { curveKey, type CurveIngredients } from './curve-ingredients';
import { curveInThread } from './curve-threads';

export type ObtainedCurve = { key: string; curve: Curve };

/** A curve that was paid for before, or a new one which is then kept. */
export async function obtainCurve(
  em: EntityManager,
  ingredients: CurveIngredients,
  signal?: AbortSignal,
): Promise<ObtainedCurve> {
  const key = curveKey(ingredients);
  const kept = await keptCurve(em, key);
  if (kept) return { key, curve: kept };
  const encoded = await curveInThread(ingredients, signal);
  const curve = decodeCurve(encoded);
  const { relativeErrorBound, shareOutsideValidRange } = curve;
  // Two workers may build the same curve at once: they get the same bits, and one of them is kept.
  await em.upsert(
    KeptCurve,
    {
      key,
      engineVersion: ENGINE_VERSION,
      encoded: Buffer.from(encoded),
      relativeErrorBound,
      shareOutsideValidRange,
      createdAt: new Date(),
    },
    { onConflictAction: 'ignore' },
  );
  return { key, curve };
}

export async function keptCurve(em: EntityManager, key: string): Promise<Curve | null> {
  const row = await em.findOne(KeptCurve, { key }, { disableIdentityMap: true });
  return row ? decodeCurve(row.encoded) : null;
}
