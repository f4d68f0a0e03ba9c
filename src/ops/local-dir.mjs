import { execFileSync } from 'node:child_process';
import { mkdirSync, statSync } from 'node:fs';
import { Failure } from './failure.mjs';
import { localDir, logDir, root } from './places.mjs';

function userName(uid) {
  try {
    return execFileSync('id', ['-nu', String(uid)], { encoding: 'utf8', stdio: ['ignore', 'pipe', 'ignore'] }).trim();
  } catch {
    return `user ${uid}`; // an owner without a name, as in a container with a mounted folder
  }
}

/** One person owns the state of a checkout; files of two owners would fail later and less clearly. */
export function ensureLocalDir() {
  try {
    mkdirSync(logDir, { recursive: true });
  } catch (error) {
    if (error.code !== 'EACCES' && error.code !== 'EPERM') throw error;
    throw new Failure(notWritable());
  }
  const owner = statSync(localDir).uid;
  if (owner !== process.getuid()) throw new Failure(foreignOwner(owner));
}

function notWritable() {
  const owner = statSync(localDir, { throwIfNoEntry: false })?.uid;
  if (owner !== undefined && owner !== process.getuid()) return foreignOwner(owner);
  return `${userName(process.getuid())} may not write in ${root}: run the command as its owner.`;
}

function foreignOwner(owner) {
  const [theirs, ours] = [userName(owner), userName(process.getuid())];
  return (
    `${localDir} was made by ${theirs} and this command runs as ${ours}: run it as ${theirs}, ` +
    `or (this deletes the local database) have ${theirs} remove ${localDir} first.`
  );
}
