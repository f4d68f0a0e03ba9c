import type { EntityManager, Loaded } from '@mikro-orm/postgresql';
import { Share } from '@/entities';
import type { Actor } from '@/src/access/actor';
import { demand } from '@/src/access/policy';
import { ownRun } from '@/src/runs/find-runs';
import type { ShareItem } from './schema';

/** The links of a run, for its group: never their secrets. */
export async function listShares(
  em: EntityManager,
  actor: Actor,
  runId: string,
): Promise<{ items: ShareItem[]; next: null }> {
  demand(actor, 'share.read');
  const run = await ownRun(em, actor, runId);
  const rows = await em.find(
    Share,
    { run: run.id },
    { populate: ['createdBy'], orderBy: { createdAt: 'desc', id: 'desc' } },
  );
  return { items: rows.map(itemOf), next: null };
}

function itemOf(share: Loaded<Share, 'createdBy'>): ShareItem {
  const open = share.expiresAt > new Date() ? 'open' : 'expired';
  return {
    id: share.id,
    createdBy: share.createdBy.name,
    createdAt: share.createdAt.toISOString(),
    expiresAt: share.expiresAt.toISOString(),
    state: share.revokedAt ? 'revoked' : open,
    hasPassphrase: Boolean(share.passphraseHash),
    mayDownload: share.mayDownload,
    views: share.views,
  };
}
