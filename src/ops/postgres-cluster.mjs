import { chownSync, existsSync, mkdirSync, renameSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { exitCodeOf, runOrFail } from './run-command.mjs';
import { Failure } from './failure.mjs';
import { asOwner } from './postgres-owner.mjs';
import { checkoutId, inLocal, logFile } from './places.mjs';
import { keptSecret } from './kept-secret.mjs';
import { writeWhole, readIfThere } from './whole-file.mjs';

const passwordFile = inLocal('postgres-password');
const pointerFile = inLocal('postgres-place');
const elsewhere = `/var/lib/chaffline-${checkoutId}`;

function giveTo(owner, path) {
  if (owner.other) chownSync(path, owner.uid, owner.gid);
}

async function canWrite(owner, dir) {
  return (await exitCodeOf('test', ['-w', dir], { ...asOwner(owner), stdio: 'ignore' })) === 0;
}

/** A folder that the database's owner can reach: below .local, or outside when the checkout lies in a closed home. */
async function ensureParent(owner) {
  const near = inLocal('postgres');
  if (!owner.other) return ensureOwned(owner, near);
  if (readIfThere(pointerFile)?.trim() === elsewhere) return ensureOwned(owner, elsewhere);
  ensureOwned(owner, near);
  if (await canWrite(owner, near)) return near;
  rmSync(near, { recursive: true });
  writeWhole(pointerFile, `${elsewhere}\n`);
  return ensureOwned(owner, elsewhere);
}

function ensureOwned(owner, dir) {
  mkdirSync(dir, { recursive: true, mode: 0o700 });
  giveTo(owner, dir);
  return dir;
}

/** Where the cluster is or would be, without making anything. */
export function clusterDir() {
  return join(readIfThere(pointerFile)?.trim() === elsewhere ? elsewhere : inLocal('postgres'), 'data');
}

/** Makes the cluster once. It is made aside and renamed, so that a killed initdb leaves nothing that looks finished. */
export async function ensureCluster(programs, owner) {
  const parent = await ensureParent(owner);
  const dataDir = join(parent, 'data');
  if (existsSync(join(dataDir, 'PG_VERSION'))) {
    if (!existsSync(passwordFile)) {
      throw new Failure(`${passwordFile} is gone, so the database in ${parent} cannot be opened any more.`);
    }
    return { dataDir, password: keptSecret(passwordFile) };
  }
  const password = keptSecret(passwordFile);
  const making = join(parent, 'making');
  rmSync(making, { recursive: true, force: true, maxRetries: 20, retryDelay: 100 }); // a killed one may still write
  ensureOwned(owner, making);
  const given = join(making, 'password');
  writeWhole(given, password, 0o600);
  giveTo(owner, given);
  await runOrFail(
    'The database could not be made',
    join(programs, 'initdb'),
    [
      ...['-D', join(making, 'data'), '-U', 'chaffline', '--pwfile', given, '-A', 'scram-sha-256'],
      ...['--locale=C.UTF-8', '--encoding=UTF8'],
    ],
    { ...asOwner(owner), log: logFile('initdb') },
  );
  renameSync(join(making, 'data'), dataDir);
  rmSync(making, { recursive: true });
  return { dataDir, password };
}
