import type { EntityManager } from '@mikro-orm/postgresql';
import { Share } from '@/entities';
import type { Actor } from '@/src/access/actor';
import { demand } from '@/src/access/policy';
import { recordChange } from '@/src/audit/record-change';
import { hashPassword } from '@/src/people/passwords';
import { newSecret, secretDigest } from '@/src/people/secrets';
import { finishedRun } from '@/src/runs/finished-run';
import type { ShareRequest } from './schema';

const dayMs = 86_400_000;

/** The link's secret is returned here and nowhere else. */
export async function makeShare(
  em: EntityManager,
  actor: Actor,
  runId: string,
  request: ShareRequest,
): Promise<{ id: string; secret: string; expiresAt: Date }> {
  demand(actor, 'share.manage');
  const run = await finishedRun(em, actor, runId);
  const passphraseHash = request.passphrase === undefined ? null : await hashPassword(request.passphrase);
  const secret = newSecret();
  return em.transactional(async (tx) => {
    const share = tx.create(Share, {
      run: run.id,
      createdBy: actor.personId,
      secretSha256: secretDigest(secret),
      passphraseHash,
      mayDownload: request.mayDownload,
      expiresAt: new Date(Date.now() + request.expiresInDays * dayMs),
    });
    await tx.flush();
    recordChange(tx, actor, {
      action: 'share.make',
      target: { kind: 'run', id: run.id, name: run.name },
      groupId: actor.groupId,
      after: {
        share: share.id,
        expiresAt: share.expiresAt.toISOString(),
        mayDownload: share.mayDownload,
        hasPassphrase: passphraseHash !== null,
      },
    });
    return { id: share.id, secret, expiresAt: share.expiresAt };
  });
}
