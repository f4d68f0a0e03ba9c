import { execFileSync } from 'node:child_process';
import { Failure } from './failure.mjs';

const idOf = (flag, user) =>
  Number(execFileSync('id', [flag, user], { encoding: 'utf8', stdio: ['ignore', 'pipe', 'ignore'] }));

/** PostgreSQL refuses to run as root: then it runs as the user of its system package, else as ourselves. */
export function postgresOwner() {
  if (process.getuid() !== 0) return { uid: process.getuid(), gid: process.getgid(), other: false };
  try {
    return { uid: idOf('-u', 'postgres'), gid: idOf('-g', 'postgres'), other: true };
  } catch {
    throw new Failure(
      'PostgreSQL does not run as root and there is no user "postgres" to run it: run the command as an ordinary user.',
    );
  }
}

/** Options of a child process of the database's owner: a working folder that every user may enter, and its identity. */
export function asOwner(owner) {
  const clean = { PATH: process.env.PATH, LANG: 'C.UTF-8', TZ: 'UTC' };
  return owner.other ? { cwd: '/', env: clean, uid: owner.uid, gid: owner.gid } : { cwd: '/', env: clean };
}
