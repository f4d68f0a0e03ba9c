import { MikroORM, type EntityManager } from '@mikro-orm/postgresql';
import { ormConfig } from '@/mikro-orm.config';
import { env } from './env';

/** One ORM per process, also across hot reloads; a failed start is forgotten so that the next request tries again. */
const held = globalThis as typeof globalThis & { chafflineOrm?: Promise<MikroORM> };

export function orm(): Promise<MikroORM> {
  held.chafflineOrm ??= MikroORM.init(ormConfig(env().DATABASE_URL)).catch((error: unknown) => {
    held.chafflineOrm = undefined;
    throw error;
  });
  return held.chafflineOrm;
}

/** A fresh entity manager: one per request, job or render. */
export async function forkEm(): Promise<EntityManager> {
  return (await orm()).em.fork();
}

export async function closeOrm(): Promise<void> {
  const open = held.chafflineOrm;
  held.chafflineOrm = undefined;
  await (await open)?.close(true);
}
