import type { EntityManager } from '@mikro-orm/postgresql';
import { Catalogue } from '@/entities';
import { ClaimLost, whileBeating } from '@/src/claim';
import { beatCatalogue, claimCatalogue } from './claim-catalogue';
import { importCatalogue } from './import-catalogue';

/** The job: claims the catalogue, imports it, and says so when that is not possible. */
export async function checkCatalogue(em: EntityManager, id: string, limits: { maxRows: number }): Promise<void> {
  const claim = await claimCatalogue(em, id);
  if (claim === null) return;
  let rows = 0;
  try {
    await whileBeating(
      () => beatCatalogue(em.fork(), id, claim, rows),
      (signal) => importCatalogue(em.fork(), id, limits, { claim, signal, onRows: (count) => (rows = count) }),
    );
  } catch (error) {
    if (error instanceof ClaimLost) return;
    await giveUp(em.fork(), id, claim);
    throw error;
  }
}

async function giveUp(em: EntityManager, id: string, claim: string): Promise<void> {
  const failure =
    'The check ended unexpectedly on our side. Upload the file again; if it stays, tell the administrator.';
  await em.nativeUpdate(
    Catalogue,
    { id, claim, status: 'checking' },
    { status: 'failed', failure, claim: null, checkedAt: new Date() },
  );
}
