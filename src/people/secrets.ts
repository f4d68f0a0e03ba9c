import { createHash, randomBytes } from 'node:crypto';

/** 256 random bits for a link; the table keeps the digest. */
export const newSecret = (): string => randomBytes(32).toString('base64url');

export const secretDigest = (secret: string): string => createHash('sha256').update(secret).digest('hex');
