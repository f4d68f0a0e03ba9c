import { createHmac, timingSafeEqual } from 'node:crypto';
import { env } from '@/src/env';

const validForMs = 12 * 3_600_000;

/** What the browser keeps once the passphrase was right: good for one share, for half a day. */
export function newProof(shareId: string): string {
  const until = String(Date.now() + validForMs);
  return `${until}.${sealOf(shareId, until)}`;
}

export function isProof(shareId: string, proof: string | undefined): boolean {
  const [until, seal] = proof?.split('.') ?? [];
  if (!until || !seal || !(Number(until) > Date.now())) return false;
  const expected = Buffer.from(sealOf(shareId, until));
  const given = Buffer.from(seal);
  return expected.length === given.length && timingSafeEqual(expected, given);
}

function sealOf(shareId: string, until: string): string {
  const { CHAFFLINE_SECRET } = env();
  if (!CHAFFLINE_SECRET) throw new Error('CHAFFLINE_SECRET is needed for shares with a passphrase');
  return createHmac('sha256', CHAFFLINE_SECRET).update(`share.${shareId}.${until}`).digest('base64url');
}

export const proofCookie = (shareId: string): string => `__Host-share-${shareId.slice(0, 8)}`;
