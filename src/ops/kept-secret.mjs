import { randomBytes } from 'node:crypto';
import { readIfThere, writeWhole } from './whole-file.mjs';

/** 32 random bytes, made once and then kept where only the owner can read them. */
export function keptSecret(path) {
  const kept = readIfThere(path)?.trim();
  if (kept) return kept;
  const secret = randomBytes(32).toString('base64url');
  writeWhole(path, `${secret}\n`, 0o600);
  return secret;
}
