import { mkdirSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { inLocal } from './places.mjs';
import { isSameProcess, processStamp } from './living-process.mjs';

const dir = inLocal('database-users');

/** Commands share the server, so each leaves its name while it needs it; the last one out stops it. */
export function enterAsUser() {
  mkdirSync(dir, { recursive: true });
  writeFileSync(join(dir, processStamp(process.pid)), '');
}

export function leaveAsUser() {
  rmSync(join(dir, processStamp(process.pid)), { force: true });
}

/** Others than ourselves; names of processes that were killed are swept away. */
export function otherUsers() {
  mkdirSync(dir, { recursive: true });
  const names = readdirSync(dir);
  for (const name of names) if (!isSameProcess(name)) rmSync(join(dir, name), { force: true });
  return names.filter((name) => isSameProcess(name) && name !== processStamp(process.pid));
}
