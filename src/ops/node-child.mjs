import { spawn } from 'node:child_process';
import { root } from './places.mjs';

const dieWithParent = new URL('./die-with-parent.mjs', import.meta.url).href;
const children = new Set();

/**
 * A Node process of ours that cannot outlive us by more than `graceMs`.
 * `out` is a file descriptor, 'inherit' or 'ignore'.
 */
export function spawnNode(
  args,
  { out = 'inherit', env = process.env, niceness = 0, detached = false, graceMs = 8_000 } = {},
) {
  // nice(1) rather than a later call: the priority of Linux belongs to each thread, so it has to be there before them.
  const command = ['nice', '-n', String(niceness), process.execPath, '--import', dieWithParent, ...args];
  const child = spawn(command[0], command.slice(1), {
    cwd: root,
    env: { ...env, CHAFFLINE_PARENT_PID: String(process.pid), CHAFFLINE_GRACE_MS: String(graceMs) },
    detached,
    stdio: ['ignore', out, out, 'ipc'],
  });
  child.channel?.unref();
  children.add(child);
  child.once('exit', () => children.delete(child));
  return child;
}

/** For an early end: what still runs is asked to stop. */
export function endNodeChildren() {
  for (const child of children) child.kill('SIGTERM');
}
