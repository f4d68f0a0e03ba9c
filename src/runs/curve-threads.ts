import { resolve } from 'node:path';
import { Piscina } from 'piscina';
import { env } from '@/src/env';
import type { Emission } from '@/src/physics/temperature';
import type { CurveIngredients } from './curve-ingredients';

const held = globalThis as typeof globalThis & { chafflineThreads?: Piscina };

function threads(): Piscina {
  held.chafflineThreads ??= new Piscina({
    filename: resolve(/*turbopackIgnore: true*/ process.cwd(), env().CHAFFLINE_STATE_DIR, 'build', 'curve-thread.mjs'),
    minThreads: 0,
    maxThreads: 2,
    idleTimeout: 30_000,
    maxQueue: 200,
  });
  return held.chafflineThreads;
}

/** Builds a curve outside the event loop; an abort ends the thread at once. */
export async function curveInThread(ingredients: CurveIngredients, signal?: AbortSignal): Promise<Uint8Array> {
  return (await threads().run(ingredients, { name: 'curve', signal })) as Uint8Array;
}

export async function emissionInThread(recipe: CurveIngredients['recipe'], signal?: AbortSignal): Promise<Emission> {
  return (await threads().run({ recipe }, { name: 'emission', signal })) as Emission;
}

export async function closeThreads(): Promise<void> {
  const open = held.chafflineThreads;
  held.chafflineThreads = undefined;
  await open?.destroy();
}
