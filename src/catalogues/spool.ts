import { createHash, randomUUID } from 'node:crypto';
import { createWriteStream, mkdirSync } from 'node:fs';
import { rm } from 'node:fs/promises';
import { join } from 'node:path';
import { Transform, type Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { Refusal } from '@/src/errors';

export type Spooled = { path: string; byteSize: number; sha256: string; remove(): Promise<void> };

/**
 * An upload goes to a file first: a slow sender then holds no transaction open, and what is cut off never reaches the
 * database.
 */
export async function spool(source: Readable, directory: string, limitBytes: number): Promise<Spooled> {
  // At once, without giving up the turn: a source that fails early must find us listening.
  mkdirSync(directory, { recursive: true });
  const path = join(directory, randomUUID());
  const hash = createHash('sha256');
  let byteSize = 0;
  const measure = new Transform({
    transform(piece: Buffer, _encoding, done) {
      byteSize += piece.length;
      if (byteSize > limitBytes)
        return done(new Refusal('tooLarge', `The file has more than ${Math.floor(limitBytes / 1048576)} MB.`));
      hash.update(piece);
      done(null, piece);
    },
  });
  const remove = () => rm(path, { force: true });
  try {
    await pipeline(source, measure, createWriteStream(path, { flags: 'wx', mode: 0o600 }));
  } catch (error) {
    await remove();
    throw error;
  }
  return { path, byteSize, sha256: hash.digest('hex'), remove };
}
