import type { EntityManager } from '@mikro-orm/postgresql';
import { newClaim, staleAfterS } from '@/src/claim';

export type RunProgress = { progress: number; stage: string };

/** Takes the run for computing; null when another worker is at it, or when there is nothing to do. */
export async function claimRun(em: EntityManager, id: string): Promise<{ claim: string; attempts: number } | null> {
  const claim = newClaim();
  const [taken] = await em.getConnection().execute<{ attempts: number }[]>(
    `update run set status = 'running', claim = ?, heartbeat_at = now(), attempts = attempts + 1,
       started_at = coalesce(started_at, now())
     where id = ? and (status = 'queued' or (status = 'running' and heartbeat_at < now() - make_interval(secs => ?)))
     returning attempts`,
    [claim, id, staleAfterS],
  );
  return taken ? { claim, attempts: taken.attempts } : null;
}

export async function beatRun(
  em: EntityManager,
  id: string,
  claim: string,
  { progress, stage }: RunProgress,
): Promise<boolean> {
  const kept = await em
    .getConnection()
    .execute<{ id: string }[]>(
      `update run set heartbeat_at = now(), progress = ?, stage = ? where id = ? and claim = ? and status = 'running' returning id`,
      [Math.min(1, Math.max(0, progress)), stage, id, claim],
    );
  return kept.length === 1;
}
