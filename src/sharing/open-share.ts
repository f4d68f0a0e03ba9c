import type { EntityManager, Loaded } from '@mikro-orm/postgresql';
import { Share } from '@/entities';
import type { RunInputs } from '@/entities/run-inputs';
import { notFound } from '@/src/errors';
import { passwordMatches } from '@/src/people/passwords';
import { secretDigest } from '@/src/people/secrets';
import { runItemOf } from '@/src/runs/find-runs';
import type { FinishedRun } from '@/src/runs/finished-run';
import type { RunItem } from '@/src/runs/schema';
import { isProof, newProof, proofCookie } from './share-proof';

type OpenShare = Loaded<Share, 'run'>;

/** Revoked, expired and never made look the same. */
export async function openShare(em: EntityManager, secret: string): Promise<OpenShare> {
  const share = await em.findOne(
    Share,
    { secretSha256: secretDigest(secret), revokedAt: null, expiresAt: { $gt: new Date() } },
    { populate: ['run'], refresh: true },
  );
  if (!share?.run.summary) throw notFound('page');
  return share;
}

/** Whether the visitor has shown the passphrase, where there is one. */
export function isUnlocked(share: OpenShare, cookieOf: (name: string) => string | undefined): boolean {
  return !share.passphraseHash || isProof(share.id, cookieOf(proofCookie(share.id)));
}

export async function unlock(share: OpenShare, passphrase: string): Promise<{ name: string; proof: string } | null> {
  const matches = await passwordMatches(passphrase, share.passphraseHash ?? undefined);
  return matches ? { name: proofCookie(share.id), proof: newProof(share.id) } : null;
}

export async function countView(em: EntityManager, share: OpenShare): Promise<void> {
  await em.getConnection().execute('update share set views = views + 1 where id = ?', [share.id]);
}

export const sharedRunOf = (share: OpenShare): FinishedRun => share.run as unknown as FinishedRun;

/** What a visitor sees of a run: an allow-list, without people, ids or anything else of the group. */
export function sharedItem(share: OpenShare): RunItem {
  const {
    name,
    status,
    progress,
    stage,
    error,
    inputs,
    summary,
    engineVersion,
    resultSha256,
    createdAt,
    startedAt,
    finishedAt,
  } = runItemOf(share.run, '');
  const { catalogue, ...others } = inputs as unknown as RunInputs;
  return {
    id: 'shared',
    requestedBy: '',
    inputs: { ...others, catalogue: { ...catalogue, id: '' } },
    ...{ name, status, progress, stage, error, summary, engineVersion, resultSha256, createdAt, startedAt, finishedAt },
  };
}
