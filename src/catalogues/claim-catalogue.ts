import type { EntityManager } from '@mikro-orm/postgresql';
import { newClaim, staleAfterS } from '@/src/claim';

/** Takes the catalogue for checking when nobody else is at it; null when somebody is, or when there is nothing to do. */
export async function claimCatalogue(em: EntityManager, id: string): Promise<string | null> {
  const claim = newClaim();
  const taken = await em.getConnection().execute<{ id: string }[]>(
    `update catalogue set claim = ?, heartbeat_at = now()
     where id = ? and status = 'checking' and (claim is null or heartbeat_at < now() - make_interval(secs => ?)) returning id`,
    [claim, id, staleAfterS],
  );
  return taken.length === 1 ? claim : null;
}

export async function beatCatalogue(
  em: EntityManager,
  id: string,
  claim: string,
  rowsChecked: number,
): Promise<boolean> {
  const kept = await em
    .getConnection()
    .execute<{ id: string }[]>(
      `update catalogue set heartbeat_at = now(), rows_checked = ? where id = ? and claim = ? and status = 'checking' returning id`,
      [rowsChecked, id, claim],
    );
  return kept.length === 1;
}
